import { bareConductor } from '../tables/bare-conductors';
import { compactBareDiameter, compactConductor } from '../tables/compact-conductors';
import { insulatedConductor } from '../tables/insulated-conductors';
import type { ConductorGroup, Insulation, Stranding, WireSize } from './run-document';
import { WIRE_SIZES } from './run-document';

export interface ConductorDimensions {
  /** Outside diameter, in. */
  diameter: number;
  /** in². */
  area: number;
}

const circle = (diameter: number): number => (Math.PI / 4) * diameter * diameter;

/** Wires are looked up on every edit of a run; the tables never change. */
const known = new Map<string, ConductorDimensions | null>();

/**
 * Outside diameter (in) and fill area (in²) of one conductor of a group; null where the tables have no row.
 * Insulated: Table 5, or 5A for compact stranding where it has the size. Bare: Table 8 (Chapter 9 Note 8). A
 * multiconductor cable counts as one conductor of its own diameter (Note 5, and Note 9 from memory).
 *
 * @example conductorDimensions({ size: '12', insulation: 'THHN', material: 'Cu', stranding: 'stranded' }) // 0.13, 0.0133
 */
export function conductorDimensions(
  group:
    | Pick<Extract<ConductorGroup, { size: WireSize }>, 'size' | 'insulation' | 'stranding'>
    | Pick<Extract<ConductorGroup, { cable: object }>, 'cable'>,
): ConductorDimensions | null {
  if ('cable' in group) return { diameter: group.cable.od, area: circle(group.cable.od) };
  const { size, insulation, stranding } = group;
  const key = `${insulation} ${size} ${stranding}`;
  const found = known.get(key);
  if (found !== undefined) return found;
  const made = fromTables(insulation, size, stranding);
  known.set(key, made);
  return made;
}

function fromTables(
  insulation: Insulation,
  size: WireSize,
  stranding: Stranding,
): ConductorDimensions | null {
  if (insulation !== 'bare') {
    const compact = stranding === 'compact' ? compactConductor(insulation, size) : null;
    return compact ?? insulatedConductor(insulation, size);
  }
  const compact = stranding === 'compact' ? compactBareDiameter(size) : null;
  if (compact !== null) return { diameter: compact, area: circle(compact) };
  const { diameter, area } = bareConductor(size, stranding === 'solid');
  return { diameter, area };
}

/** True where compact stranding was asked for and Table 5A has no row, so that Table 5's larger figure stands in. */
export function isCompactAssumed(insulation: Insulation, size: WireSize): boolean {
  return insulation === 'bare'
    ? compactBareDiameter(size) === null
    : compactConductor(insulation, size) === null;
}

/** The sizes an insulation is made in, by Table 5 (bare: Table 8). */
export function wireSizesOf(insulation: Insulation): WireSize[] {
  return WIRE_SIZES.filter((size) => fromTables(insulation, size, 'stranded') !== null);
}
