import { WIRE_SIZES } from '@fairlead/shared';
import type { FillAnswer, WireSize } from '@fairlead/shared';

/** in², as the tables print them. */
export const areaText = (area: number) => area.toFixed(area < 10 ? 4 : 3);
export const ratioText = (ratio: number) => ratio.toFixed(2);
/** in. */
export const clearanceText = (clearance: number) => clearance.toFixed(2);

/** How many more of each size still fit, thinnest first; sizes with no room are left out. */
export function roomLeft({ room }: FillAnswer): { size: WireSize; count: number }[] {
  return WIRE_SIZES.flatMap((size) => {
    const count = room[size] ?? 0;
    return count > 0 ? [{ size, count }] : [];
  });
}
