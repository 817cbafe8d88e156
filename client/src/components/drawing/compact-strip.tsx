import { drawCompactStrip } from '@fairlead/shared';
import type { StripSummary } from '@fairlead/shared';
import { useMemo } from 'react';
import { DisplayListSvg } from './display-list-svg';

interface Props {
  strip: StripSummary;
  width: number;
  /** in; the length that fills the width, to compare runs. */
  scaleTo?: number;
}

/** The run in one row of a list. Its degrees, length and status stand beside it as words. */
export function CompactStrip({ strip, width, scaleTo }: Props) {
  const list = useMemo(() => drawCompactStrip(strip, { width, scaleTo }), [strip, width, scaleTo]);
  return <DisplayListSvg list={list} />;
}
