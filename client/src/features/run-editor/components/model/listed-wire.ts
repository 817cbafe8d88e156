import { STRANDINGS, WIRE_SIZES, conductorDimensions } from '@fairlead/shared';
import type { WireGroup } from '@fairlead/shared';

/**
 * A changed wire that the tables list. Where the change alone would leave them, the stranding gives way first, then the
 * size, to the nearest listed. Example: 750 THHN made compact stays 750 where Table 5A has no such row but Table 5 has.
 */
export function listedWire(group: WireGroup, change: Partial<WireGroup>): WireGroup {
  const wanted = { ...group, ...change };
  const isListed = (wire: WireGroup) => conductorDimensions(wire) !== null;
  if (isListed(wanted)) return wanted;
  const restranded = STRANDINGS.map((stranding) => ({ ...wanted, stranding })).find(isListed);
  if (restranded && change.stranding === undefined) return restranded;
  const at = WIRE_SIZES.indexOf(wanted.size);
  const nearest = WIRE_SIZES.map((size, place) => ({ size, away: Math.abs(place - at) }))
    .sort((a, b) => a.away - b.away)
    .map(({ size }) => ({ ...wanted, size }))
    .find(isListed);
  return nearest ?? restranded ?? wanted;
}
