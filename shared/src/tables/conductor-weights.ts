import type { Insulation, Material, WireSize } from '../run/run-document';

/** lb per 1000 ft of one stranded copper conductor. */
type Row = readonly [WireSize, number];

/**
 * Title: weight of THHN/THWN copper building wire, 600 V.
 * Source: a US catalogue "THWN or THHN, PVC insulation, nylon jacket, 600 V" for 14 AWG to 250 kcmil; 300 to 1000 kcmil from
 * memory of a US maker's catalogue, within 0.6 % of copper and PVC by volume.
 * Units: lb/kft.
 */
// prettier-ignore
export const THHN_COPPER: readonly Row[] = [
  ['14', 16], ['12', 24], ['10', 38], ['8', 64], ['6', 98], ['4', 155], ['3', 190], ['2', 236], ['1', 300],
  ['1/0', 372], ['2/0', 462], ['3/0', 575], ['4/0', 716], ['250', 846], ['300', 1011], ['350', 1173],
  ['400', 1333], ['500', 1653], ['600', 1985], ['750', 2462], ['1000', 3254],
];

/**
 * Title: weight of XHHW-2 copper building wire, 600 V.
 * Source: a US catalogue "XHHW-2, XLP insulation, 600 V".
 * Units: lb/kft.
 */
// prettier-ignore
export const XHHW_COPPER: readonly Row[] = [
  ['14', 18], ['12', 27], ['10', 40], ['8', 66], ['6', 96], ['4', 145], ['3', 182], ['2', 225], ['1', 290],
  ['1/0', 360], ['2/0', 450], ['3/0', 555], ['4/0', 700], ['250', 830], ['300', 990], ['350', 1150],
  ['400', 1310], ['500', 1620], ['600', 1980], ['750', 2445],
];

/** Metal of one kcmil, lb/kft: density of copper and aluminum. */
export const METAL_PER_KCMIL: Record<Material, number> = { Cu: 3.088, Al: 0.939 };

/** Insulation, lb/kft for each square inch of it: PVC with nylon, or cross-linked. Derived from the two catalogues above. */
export const COVER_PER_AREA: Record<Exclude<Insulation, 'bare'>, number> = {
  THHN: 607,
  THW: 607,
  'XHHW-2': 424,
  'RHW-2': 424,
  'RHW-2-covered': 424,
};

const PUBLISHED: Partial<Record<Insulation, ReadonlyMap<WireSize, number>>> = {
  THHN: new Map(THHN_COPPER),
  'XHHW-2': new Map(XHHW_COPPER),
};

/** lb/kft of a copper conductor as published; null where no figure was found. */
export function publishedWeight(insulation: Insulation, size: WireSize): number | null {
  return PUBLISHED[insulation]?.get(size) ?? null;
}
