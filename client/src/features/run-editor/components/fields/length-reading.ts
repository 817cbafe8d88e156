import { formatLength, parseLength } from '@fairlead/shared';
import type { Say } from '../../../../hooks/use-words';
import type { Refusal } from '../hooks/use-edit';
import type { Read } from './use-typed-field';

export interface LengthFieldProps {
  label: string;
  /** Names what is typed in the store. */
  fieldKey: string;
  /** in; null: not given. */
  value: number | null;
  /** in. */
  max: number;
  /** A make-up may be 0; a length may not. */
  allowZero?: boolean;
  /** An empty field means "not given". */
  isOptional?: boolean;
  /** What is taken when nothing is given. */
  placeholder?: string;
  /** Said under the field while it is not being typed in. */
  help?: string;
  /** How the length is measured, e.g. "to corner"; stands inside the field. */
  measured?: string;
  disabled?: boolean;
  /** From what is typed to what is kept; null where nothing would be left. `least` is then what it has to be more than. */
  convert?: { toKept: (inches: number) => number; toShown: (inches: number) => number };
  onCommit: (inches: number | null) => Refusal;
}

/** Below this a conversion has left nothing, in. */
const NOTHING = 1e-6;

export function shownLength({ value, convert }: Pick<LengthFieldProps, 'value' | 'convert'>) {
  if (value === null) return '';
  return formatLength(convert ? convert.toShown(value) : value);
}

/** Reads what was typed; a refusal says what would be right. */
export function readLength(typed: string, props: LengthFieldProps, say: Say): Read<number | null> {
  const refuse = (message: string): Read<number | null> => ({ ok: false, message });
  if (typed.trim() === '') {
    if (props.isOptional) return { ok: true, value: null };
    return refuse(say('workbench.length.problem.empty'));
  }
  const parsed = parseLength(typed);
  if (!parsed.ok) return refuse(say(`workbench.length.problem.${parsed.code}`));
  const kept = props.convert ? props.convert.toKept(parsed.inches) : parsed.inches;
  if (props.convert && parsed.inches > 0 && kept <= NOTHING) {
    const least = formatLength(props.convert.toShown(0));
    return refuse(say('workbench.length.problem.noFit', { least }));
  }
  if (kept < 0 || (kept === 0 && !props.allowZero)) {
    return refuse(say(`workbench.length.problem.${props.allowZero ? 'zero' : 'positive'}`));
  }
  if (kept > props.max) {
    return refuse(say('workbench.length.problem.tooLong', { max: formatLength(props.max) }));
  }
  return { ok: true, value: kept };
}
