import { Popover } from '@mantine/core';
import { wordVerdict } from '@fairlead/shared';
import type { CheckName, Verdict } from '@fairlead/shared';
import { StatusGlyph } from '../../../../components/drawing/status-glyph';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { useWording } from '../hooks/use-labels';
import { placeOf } from '../model/place-of';
import frame from '../workbench.module.css';
import classes from './verdicts.module.css';

/** What is asked of every run, in the row whatever the answer. */
const ALWAYS: readonly CheckName[] = ['degrees', 'tension', 'fill', 'jam', 'sidewall'];
/** In the row where they are not met; met, they stand together behind one button. */
const WHEN_NOT_MET: readonly CheckName[] = [
  'access',
  'clearance',
  'radius',
  'bend-fits-leg',
  'length',
];

interface Shown {
  row: Verdict[];
  met: Verdict[];
}

/** Which verdicts take a place in the row. Missing directions are told at each piece unless something is wrong. */
export function shownVerdicts(verdicts: readonly Verdict[]): Shown {
  const isMet = ({ check, status }: Verdict) => WHEN_NOT_MET.includes(check) && status === 'ok';
  return {
    row: verdicts.filter(
      (verdict) =>
        ALWAYS.includes(verdict.check) ||
        (WHEN_NOT_MET.includes(verdict.check) && !isMet(verdict)) ||
        (verdict.check === 'directions' && verdict.status !== 'ok'),
    ),
    met: verdicts.filter(isMet),
  };
}

/** What each check says of its worst place. A click goes there. */
export function VerdictRow({ onGo }: { onGo: (elementId: string) => void }) {
  const { say } = useWords();
  const verdicts = useRunEditor((state) => state.analysis.verdicts);
  const { row, met } = shownVerdicts(verdicts);
  return (
    <div className={classes.row} role="group" aria-label={say('workbench.verdict.row')}>
      {row.map((verdict) => (
        <VerdictButton key={verdict.check} verdict={verdict} onGo={onGo} />
      ))}
      {met.length > 0 && (
        <Popover position="bottom-end" shadow="none">
          <Popover.Target>
            <button type="button" className={classes.verdict} data-status="ok">
              <StatusGlyph status="ok" size={18} />
              {say('workbench.verdict.moreOk', { count: met.length })}
            </button>
          </Popover.Target>
          <Popover.Dropdown className={classes.met}>
            {met.map((verdict) => (
              <VerdictButton key={verdict.check} verdict={verdict} onGo={onGo} />
            ))}
          </Popover.Dropdown>
        </Popover>
      )}
    </div>
  );
}

function VerdictButton({ verdict, onGo }: { verdict: Verdict; onGo: (elementId: string) => void }) {
  const { say } = useWords();
  const wording = useWording();
  const sections = useRunEditor((state) => state.analysis.sections);
  const document = useRunEditor((state) => state.document);
  const place = placeOf(verdict, sections, document);
  return (
    <button
      type="button"
      className={classes.verdict}
      data-status={verdict.status}
      data-check={verdict.check}
      onClick={() => place !== null && onGo(place)}
    >
      <StatusGlyph status={verdict.status} size={18} />
      <b>{say(`workbench.verdict.check.${verdict.check}`)}</b>
      <span className={frame.visuallyHidden}>{say(`app.status.${verdict.status}`)}</span>
      <span>{wordVerdict(verdict, wording)}</span>
    </button>
  );
}
