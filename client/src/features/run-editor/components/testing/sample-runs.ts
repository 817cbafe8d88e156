import { bend, buildRun, offset, pullPoint, straight } from '@fairlead/shared';
import type { PathElement, RunDocument } from '@fairlead/shared';

/** 90, 90, 90, an offset and a box offset of 10: 350° with the offset at 30, 380° at 45, 335° at 22½. */
export function threeNineties(offsetAngle = 30, overrides: Partial<RunDocument> = {}): RunDocument {
  const leg = () => straight({ length: 120 });
  const path: PathElement[] = [
    pullPoint({ device: 'cabinet', label: 'LP-2' }),
    leg(),
    bend({ toward: 'up' }),
    leg(),
    bend({ toward: 'north' }),
    leg(),
    bend({ toward: 'east' }),
    leg(),
    offset({ rise: 10, angle: offsetAngle, toward: 'up' }),
    leg(),
    offset({ rise: 0.5, angle: 10, toward: 'up' }),
    leg(),
    pullPoint({ device: 'cabinet', label: 'AHU-4' }),
  ];
  return buildRun({ tag: 'L2-14', path, ...overrides });
}

/** The ids `threeNineties` gives its pieces. */
export const IDS = {
  start: 'e1',
  first90: 'e3',
  offset: 'e9',
  boxOffset: 'e11',
  end: 'e13',
} as const;
