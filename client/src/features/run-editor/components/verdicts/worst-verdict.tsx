import { wordVerdict } from '@fairlead/shared';
import { IconChevronRight } from '@tabler/icons-react';
import { StatusGlyph } from '../../../../components/drawing/status-glyph';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { useWording } from '../hooks/use-labels';
import { headline, worstVerdict } from '../model/headline';
import { shownVerdicts } from './verdict-row';
import classes from './verdicts.module.css';

/** The phone's one line: the worst check, and how many more there are. Opens To fix. */
export function WorstVerdict({ onOpen }: { onOpen: () => void }) {
  const { say } = useWords();
  const wording = useWording();
  const { row, met } = shownVerdicts(useRunEditor((state) => state.analysis.verdicts));
  const verdicts = [...row, ...met];
  const worst = worstVerdict(verdicts);
  if (!worst) return null;
  return (
    <button type="button" className={classes.worst} onClick={onOpen}>
      <StatusGlyph status={worst.status} size={28} />
      <span>
        <b>{headline(verdicts, say)}</b>
        {worst.status !== 'ok' && (
          <>
            {'. '}
            {`${say(`workbench.verdict.check.${worst.check}`)}: ${wordVerdict(worst, wording)}`}
          </>
        )}
      </span>
      <IconChevronRight size={22} aria-hidden />
    </button>
  );
}
