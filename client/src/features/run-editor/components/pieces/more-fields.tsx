import type { ReactNode } from 'react';
import { useWords } from '../../../../hooks/use-words';
import classes from '../rail/rail.module.css';

/** Fields that are seldom touched, behind one line. */
export function MoreFields({ children }: { children: ReactNode }) {
  const { say } = useWords();
  return (
    <details className={classes.moreFields}>
      <summary>{say('workbench.selected.moreFields')}</summary>
      {children}
    </details>
  );
}
