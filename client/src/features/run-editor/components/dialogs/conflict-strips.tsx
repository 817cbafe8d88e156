import { analyzeRun, expandRun, formatAngle, summarizeRun } from '@fairlead/shared';
import type { RunDocument } from '@fairlead/shared';
import { useMemo } from 'react';
import { CompactStrip } from '../../../../components/drawing/compact-strip';
import { useWords } from '../../../../hooks/use-words';
import type { Conflict } from '../../state/run-editor-state';
import { useSettings } from '../hooks/use-settings';
import { useWidth } from '../hooks/use-width';
import classes from './dialogs.module.css';

/** Both versions drawn to one scale. */
export function ConflictStrips({ conflict }: { conflict: Conflict }) {
  const { say } = useWords();
  const settings = useSettings();
  const { ref, width } = useWidth();
  const { mine } = conflict;
  const theirs = conflict.theirs.revision.document;
  const versions = useMemo(() => {
    const summary = (document: RunDocument) =>
      summarizeRun(document, analyzeRun(document, settings), expandRun(document, settings));
    return [
      { key: 'mine', summary: summary(mine) },
      { key: 'theirs', summary: summary(theirs) },
    ] as const;
  }, [mine, theirs, settings]);
  const lengths = versions.map(({ summary }) => summary.strip.length);
  const longest = Math.max(...lengths.map((length) => length ?? 0));
  const scaleTo = lengths.every((length) => length !== null) ? longest : undefined;
  return (
    <div ref={ref} className={classes.strips}>
      {versions.map(({ key, summary }) => (
        <figure key={key} className={classes.strip}>
          <figcaption>
            <b>{say(`workbench.conflict.${key}`)}</b>{' '}
            {say('workbench.conflict.degrees', {
              degrees: formatAngle(summary.worstSectionDegrees),
            })}
          </figcaption>
          {width > 0 && <CompactStrip strip={summary.strip} width={width} scaleTo={scaleTo} />}
        </figure>
      ))}
    </div>
  );
}
