import { LEG_MEASURES } from '@fairlead/shared';
import type { LegMeasure } from '@fairlead/shared';
import { create } from 'zustand';

const KEY = 'fairlead.leg-measure';

function kept(): LegMeasure {
  try {
    const value = localStorage.getItem(KEY);
    return LEG_MEASURES.find((measure) => measure === value) ?? 'corner';
  } catch {
    return 'corner';
  }
}

/** How legs are measured on this device, from the last time it was chosen. */
export const useLegMeasure = create<{ measure: LegMeasure }>(() => ({ measure: kept() }));

export function chooseLegMeasure(measure: LegMeasure): void {
  try {
    localStorage.setItem(KEY, measure);
  } catch {
    // Without storage the choice holds until the page closes.
  }
  useLegMeasure.setState({ measure });
}
