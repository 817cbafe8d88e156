import { drawSketch } from '@fairlead/shared';
import type { ExpandedRun, RunAnalysis } from '@fairlead/shared';
import { useMemo } from 'react';
import { useTheme } from '../../hooks/use-theme';
import { useWords } from '../../hooks/use-words';
import { DisplayListSvg } from './display-list-svg';

interface Props {
  expanded: ExpandedRun;
  analysis: RunAnalysis;
  width: number;
  height: number;
  selectedId: string | null;
  cursor: number | null;
}

/** The run in space. Decorative for a screen reader: the list says every direction. */
export function Sketch({ expanded, analysis, width, height, selectedId, cursor }: Props) {
  const { say } = useWords();
  const { sun } = useTheme();
  const list = useMemo(
    () => drawSketch({ expanded, analysis, width, height, selectedId, cursor, sun, say }),
    [expanded, analysis, width, height, selectedId, cursor, sun, say],
  );
  return <DisplayListSvg list={list} />;
}
