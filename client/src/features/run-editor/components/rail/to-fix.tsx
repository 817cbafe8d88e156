import type { Finding } from '@fairlead/shared';
import { useState } from 'react';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import fieldClasses from '../fields/fields.module.css';
import { FindingCard } from './finding-card';
import classes from './rail.module.css';

/** The rest waits behind one key, so that the selected piece stays in sight. */
const SHOWN = 2;

const keyOf = ({ code, at }: Finding) =>
  [code, at.elementId, at.sectionId, at.pullId].filter(Boolean).join(' ');

interface Props {
  onGo: (elementId: string) => void;
  /** The title stands above it already. */
  isBare?: boolean;
}

/** The findings, worst first, each with the ways to put it right; notes stand under them. */
export function ToFix({ onGo, isBare = false }: Props) {
  const { say } = useWords();
  const findings = useRunEditor((state) => state.findings);
  const toFix = [
    ...findings.filter(({ severity }) => severity === 'stop'),
    ...findings.filter(({ severity }) => severity === 'caution'),
  ];
  const [isAll, setAll] = useState(isBare);
  const shown = isAll ? toFix : toFix.slice(0, SHOWN);
  const notes = findings.filter(({ severity }) => severity === 'note');
  return (
    <section className={classes.card} aria-label={isBare ? undefined : say('workbench.fix.title')}>
      <div className={classes.head} hidden={isBare}>
        <h2 className={classes.title}>{say('workbench.fix.title')}</h2>
        {toFix.length > 0 && (
          <span className={classes.aside}>
            {say('workbench.fix.count', { shown: shown.length, total: toFix.length })}
          </span>
        )}
      </div>
      {toFix.length === 0 && <p className={classes.quiet}>{say('workbench.fix.none')}</p>}
      <ul className={classes.findings}>
        {shown.map((finding) => (
          <FindingCard key={keyOf(finding)} finding={finding} onGo={onGo} />
        ))}
      </ul>
      {toFix.length > SHOWN && !isBare && (
        <button
          type="button"
          className={fieldClasses.textButton}
          aria-expanded={isAll}
          onClick={() => setAll(!isAll)}
        >
          {isAll ? say('workbench.fix.few') : say('workbench.fix.all', { count: toFix.length })}
        </button>
      )}
      {notes.length > 0 && (
        <details className={classes.notes}>
          <summary>{say('workbench.fix.notes', { count: notes.length })}</summary>
          <ul className={classes.findings}>
            {notes.map((finding) => (
              <FindingCard key={keyOf(finding)} finding={finding} onGo={onGo} />
            ))}
          </ul>
        </details>
      )}
      <p className={classes.caution}>{say('workbench.caution')}</p>
    </section>
  );
}
