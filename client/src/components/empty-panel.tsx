import type { ReactNode } from 'react';
import classes from './panel.module.css';

/** A place with nothing in it yet: what belongs here and the one act that starts it. */
export function EmptyPanel({ words, children }: { words: string; children?: ReactNode }) {
  return (
    <div className={classes.panel}>
      <p className={classes.words}>{words}</p>
      {children}
    </div>
  );
}
