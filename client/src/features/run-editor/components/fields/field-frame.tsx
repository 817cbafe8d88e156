import type { ReactNode } from 'react';
import classes from './fields.module.css';

interface Props {
  label: string;
  /** The control's id. */
  controlId: string;
  /** Stands under the field: what a bare number means, or what is wrong and what would be right. */
  help?: ReactNode;
  isError?: boolean;
  /** A field that is picked, not typed, has nothing to say most of the time and keeps no line for it. */
  isPicked?: boolean;
  children: ReactNode;
}

export const helpId = (controlId: string) => `${controlId}-help`;

/** A label, a control and the line under it, which keeps its place when it is empty. */
export function FieldFrame({
  label,
  controlId,
  help,
  isError = false,
  isPicked = false,
  children,
}: Props) {
  return (
    <div className={classes.field}>
      <label className={classes.label} htmlFor={controlId}>
        {label}
      </label>
      {children}
      {(!isPicked || help) && (
        <p
          id={helpId(controlId)}
          className={classes.help}
          data-error={isError || undefined}
          role={isError ? 'alert' : undefined}
        >
          {help}
        </p>
      )}
    </div>
  );
}
