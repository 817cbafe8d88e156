import classes from './auth.module.css';

/** Always there, so that a screen reader announces what appears in it. */
export function FormFailure({ words }: { words: string | null }) {
  return (
    <div role="alert" className={words ? classes.failure : undefined}>
      {words}
    </div>
  );
}
