import { useAfter } from '../hooks/use-after';
import { useWords } from '../hooks/use-words';
import classes from './list-skeleton.module.css';

/** Rows as tall as the real ones, shown from 100 ms on; after two seconds words say what takes so long. */
export function ListSkeleton({ rows, rowHeight }: { rows: number; rowHeight: string }) {
  const { say } = useWords();
  const show = useAfter(100);
  const long = useAfter(2000);
  return (
    <div className={classes.list} data-show={show || undefined}>
      <p role="status" className={long ? classes.words : 'visually-hidden'}>
        {long ? say('app.loadingLong') : say('app.loading')}
      </p>
      {Array.from({ length: rows }, (_, row) => (
        <div key={row} className={classes.row} style={{ height: rowHeight }} aria-hidden />
      ))}
    </div>
  );
}
