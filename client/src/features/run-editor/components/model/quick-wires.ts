import { numberGroups, wires } from '@fairlead/shared';
import type {
  ConductorUse,
  RunCommand,
  RunDocument,
  WireColour,
  WireGroup,
} from '@fairlead/shared';
import { listedWire } from './listed-wire';

/** The sets of one size a circuit is usually pulled as. */
export const QUICK_SETS = [
  { key: 'three', hots: 3, neutral: true, ground: true },
  { key: 'threeGround', hots: 3, neutral: false, ground: true },
  { key: 'two', hots: 2, neutral: true, ground: true },
  { key: 'one', hots: 1, neutral: true, ground: true },
] as const;
export type QuickSet = (typeof QUICK_SETS)[number];

export type QuickWire = Pick<WireGroup, 'size' | 'insulation' | 'material'>;

/**
 * The commands that add hots, neutral and ground of one size. The neutral is white and the ground green (NEC 200.6 and
 * 250.119); hots stay without a colour, phase colours are convention.
 */
export function quickWires(document: RunDocument, set: QuickSet, wire: QuickWire): RunCommand[] {
  const group = (count: number, use: ConductorUse, colour?: WireColour): WireGroup =>
    listedWire(wires({ ...wire, count, use, ...(colour && { colour }) }), {});
  const groups = [
    group(set.hots, 'phase'),
    ...(set.neutral ? [group(1, 'neutral', 'WH')] : []),
    ...(set.ground ? [group(1, 'ground', 'GN')] : []),
  ];
  return numberGroups(document, groups).map((added) => ({
    command: 'add-conductors',
    args: { group: added },
  }));
}
