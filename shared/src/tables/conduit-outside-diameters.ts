import type { RacewayType, TradeSize } from '../run/run-document';

/**
 * Outside diameter of conduit, in.
 *
 * Edition: ANSI C80.3 (EMT), C80.6 (IMC), C80.1 (RMC), NEMA TC-2 with iron-pipe sizes (PVC), IPS (HDPE), as republished.
 * Sources: EMT, Steel Tube Institute product pages; IMC, Cooper B-Line conduit data; RMC, Cooper B-Line and Thomas &
 * Betts conduit dimensional data; PVC, Snohomish PUD material standards 250027.1 and 250267.1; HDPE, Atkore catalogue.
 * Cross-checked: EMT less twice its wall is the inside diameter of NEC Chapter 9 Table 4 exactly; RMC is equal in two
 * lists; each IMC figure lies within the least and greatest its standard allows; PVC is equal in three lists.
 * Not listed: flexible types, ENT, PVC-A and PVC-EB, for which no diameter was read.
 */
type BySize = Partial<Record<TradeSize, number>>;

const IRON_PIPE: BySize = {
  '1/2': 0.84,
  '3/4': 1.05,
  '1': 1.315,
  '1-1/4': 1.66,
  '1-1/2': 1.9,
  '2': 2.375,
  '2-1/2': 2.875,
  '3': 3.5,
  '3-1/2': 4.0,
  '4': 4.5,
  '5': 5.563,
  '6': 6.625,
};

/** The HDPE catalogue lists neither 1/2 nor 3-1/2. */
const HDPE: BySize = {
  '3/4': 1.05,
  '1': 1.315,
  '1-1/4': 1.66,
  '1-1/2': 1.9,
  '2': 2.375,
  '2-1/2': 2.875,
  '3': 3.5,
  '4': 4.5,
  '5': 5.563,
  '6': 6.625,
};

export const CONDUIT_OUTSIDE_DIAMETERS: Partial<Record<RacewayType, BySize>> = {
  EMT: {
    '1/2': 0.706,
    '3/4': 0.922,
    '1': 1.163,
    '1-1/4': 1.51,
    '1-1/2': 1.74,
    '2': 2.197,
    '2-1/2': 2.875,
    '3': 3.5,
    '3-1/2': 4.0,
    '4': 4.5,
  },
  IMC: {
    '1/2': 0.815,
    '3/4': 1.029,
    '1': 1.29,
    '1-1/4': 1.638,
    '1-1/2': 1.883,
    '2': 2.36,
    '2-1/2': 2.857,
    '3': 3.476,
    '3-1/2': 3.971,
    '4': 4.466,
  },
  RMC: IRON_PIPE,
  'PVC-40': IRON_PIPE,
  'PVC-80': IRON_PIPE,
  'HDPE-40': HDPE,
};

/** Outside diameter, in; null where no list was read. Example: 3/4 EMT is 0.922. */
export function conduitOutsideDiameter(type: RacewayType, tradeSize: TradeSize): number | null {
  return CONDUIT_OUTSIDE_DIAMETERS[type]?.[tradeSize] ?? null;
}
