import { wordVerdict } from '@fairlead/shared';
import type { CheckName, Verdict } from '@fairlead/shared';
import { StatusGlyph } from '../../../../components/drawing/status-glyph';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { useWording } from '../hooks/use-labels';
import { placeOf } from '../model/place-of';
import frame from '../workbench.module.css';
import classes from './verdicts.module.css';

/** Missing directions are told at each piece; they take a place in the row only when something is wrong. */
const SHOWN: readonly CheckName[] = [
  'degrees',
  'access',
  'fill',
  'jam',
  'clearance',
  'radius',
  'bend-fits-leg',
  'length',
];

export function shownVerdicts(verdicts: readonly Verdict[]): Verdict[] {
  return verdicts.filter(
    ({ check, status }) => SHOWN.includes(check) || (check === 'directions' && status !== 'ok'),
  );
}

/** What each check says of its worst place. A click goes there. */
export function VerdictRow({ onGo }: { onGo: (elementId: string) => void }) {
  const { say } = useWords();
  const wording = useWording();
  const verdicts = useRunEditor((state) => state.analysis.verdicts);
  const sections = useRunEditor((state) => state.analysis.sections);
  const document = useRunEditor((state) => state.document);
  return (
    <div className={classes.row} role="group" aria-label={say('workbench.verdict.row')}>
      {shownVerdicts(verdicts).map((verdict) => {
        const check = say(`workbench.verdict.check.${verdict.check}`);
        const words = wordVerdict(verdict, wording);
        const status = say(`app.status.${verdict.status}`);
        const place = placeOf(verdict, sections, document);
        return (
          <button
            key={verdict.check}
            type="button"
            className={classes.verdict}
            data-status={verdict.status}
            data-check={verdict.check}
            onClick={() => place !== null && onGo(place)}
          >
            <StatusGlyph status={verdict.status} size={18} />
            <b>{check}</b>
            <span className={frame.visuallyHidden}>{status}</span>
            <span>{words}</span>
          </button>
        );
      })}
    </div>
  );
}
