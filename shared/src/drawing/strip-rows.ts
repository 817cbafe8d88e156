import type { StripLook } from './strip-look';

/** Where the rows and lanes of a strip stand, px from its top: baselines of texts, tops of lanes. */
export interface StripRows {
  pullsText: number;
  pullsBar: number;
  tensionNote: number;
  tension: number;
  /** Baseline of the lower row of bend labels. */
  labels: number;
  /** The middle of the conduit. */
  run: number;
  names: number;
  height: number;
  heightLabel: number;
  limit: number;
  degrees: number;
  totals: number;
  axis: number;
  bottom: number;
}

const AIR = 6;
/** Between the lane of height and the degrees: their lines should not be read as one lane. */
const LANE_AIR = 10;

export function stripRows(
  look: StripLook,
  has: { pulls: boolean; height: boolean; lengths: boolean },
): StripRows {
  const hasHeight = has.height;
  const tension = look.pulls + look.tensionNote;
  const underPulls = has.pulls ? tension + look.tension + LANE_AIR : 0;
  const labels = underPulls + look.labelRows * look.labelRow;
  const run = labels + 4 + look.tick + look.bore / 2;
  const underRun = run + Math.max(look.halfBox, look.bore / 2 + 3);
  const names = underRun + look.names - 7;
  const underNames = underRun + look.names;
  const heightLabelRoom = hasHeight && look.gutter === 0 ? look.limitRow : 0;
  const height = underNames + (hasHeight ? AIR : 0) + heightLabelRoom;
  const underHeight = hasHeight ? height + look.height : underNames;
  const degrees =
    underHeight + look.limitRow + (look.limitRow > 0 ? 2 : hasHeight ? LANE_AIR : AIR);
  const underDegrees = degrees + look.degrees;
  const axis = underDegrees + look.totals;
  const axisRoom = has.lengths ? look.axis : 0;
  return {
    pullsText: look.text + 2,
    pullsBar: look.pulls - 8,
    tensionNote: tension - 4,
    tension,
    labels: labels - 4,
    run,
    names,
    height,
    heightLabel: height - 4,
    limit: degrees - 4,
    degrees,
    totals: axis - look.totals + look.text + 3,
    axis,
    bottom: Math.ceil(axis + axisRoom),
  };
}
