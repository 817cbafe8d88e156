import { wordFinding, wordFix } from '@fairlead/shared';
import type { Finding, Fix, Status } from '@fairlead/shared';
import { useState } from 'react';
import { StatusGlyph } from '../../../../components/drawing/status-glyph';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import fieldClasses from '../fields/fields.module.css';
import { useEdit } from '../hooks/use-edit';
import { useWording } from '../hooks/use-labels';
import classes from './rail.module.css';

const STATUS: Record<Finding['severity'], Status> = { stop: 'over', caution: 'watch', note: 'ok' };
/** More than these wait behind "More ways". */
const SHOWN_FIXES = 2;

interface Props {
  finding: Finding;
  onGo: (elementId: string) => void;
}

/** What is wrong, why, and what would put it right: a fix is one row, the act at the left, what it gives at the right. */
export function FindingCard({ finding, onGo }: Props) {
  const { say } = useWords();
  const wording = useWording();
  const edit = useEdit();
  const canEdit = useRunEditor((state) => state.canEdit);
  const [isOpen, setOpen] = useState(false);
  const [refusal, setRefusal] = useState<string | null>(null);
  const { title, body, rule } = wordFinding(finding, wording);
  const fixes = canEdit ? (finding.fixes ?? []) : [];
  const shown = isOpen ? fixes : fixes.slice(0, SHOWN_FIXES);
  const place = finding.at.elementId ?? finding.at.sectionId;

  const apply = (fix: Fix) => {
    setRefusal(edit(fix.commands, { label: { key: 'edits.did.fix', values: {} } }));
  };
  return (
    <li className={classes.finding} data-finding={finding.code}>
      <StatusGlyph status={STATUS[finding.severity]} size={22} />
      <button
        type="button"
        className={classes.findingTitle}
        onClick={() => place !== undefined && onGo(place)}
      >
        {title}
      </button>
      {(body || rule) && (
        <p className={classes.findingBody}>
          {body} {rule && <b>{rule}</b>}
        </p>
      )}
      {fixes.length > 0 && (
        <div className={classes.fixes}>
          {shown.map((fix) => {
            const { act, result } = wordFix(fix, wording);
            return (
              <button
                key={`${fix.kind} ${act} ${result}`}
                type="button"
                className={classes.fix}
                data-fix={fix.kind}
                onClick={() => apply(fix)}
              >
                <b>{act}</b> <span>{result}</span>
              </button>
            );
          })}
          {fixes.length > SHOWN_FIXES && (
            <button
              type="button"
              className={`${fieldClasses.textButton} ${classes.more}`}
              aria-expanded={isOpen}
              onClick={() => setOpen(!isOpen)}
            >
              {say(isOpen ? 'workbench.fix.fewer' : 'workbench.fix.more')}
            </button>
          )}
        </div>
      )}
      {refusal && (
        <p className={classes.findingBody} role="alert">
          {say('workbench.selected.refused', { why: refusal })}
        </p>
      )}
    </li>
  );
}
