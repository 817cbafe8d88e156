import { useCallback, useEffect, useRef, useState } from 'react';
import type { KeyboardEvent } from 'react';
import { useRunEditor } from '../../state/use-run-editor';
import type { Refusal } from '../hooks/use-edit';

export type Read<T> = { ok: true; value: T } | { ok: false; message: string };

interface Options<T> {
  /** Names what is typed in the store, so that a reload brings it back. */
  fieldKey: string;
  /** The value as it is always written. */
  shown: string;
  read: (text: string) => Read<T>;
  /** Puts the value into the run; answers why not, or null. */
  commit: (value: T) => Refusal;
}

export interface TypedField {
  text: string;
  isFocused: boolean;
  /** What is wrong and what would be right; null while it is being typed or is right. */
  error: string | null;
  type: (text: string) => void;
  onFocus: () => void;
  onBlur: () => void;
  onKeyDown: (event: KeyboardEvent<HTMLInputElement>) => void;
  /** Takes over what is typed now. */
  finish: () => boolean;
}

/**
 * A field whose value is typed as text. What is typed is a draft in the store until it reads; on leaving the field it
 * becomes the value, shown in the one form. A text that can't be read stays as it was typed, with the reason. Esc takes
 * a change back; pressed again it brings back the text as it was last typed.
 */
export function useTypedField<T>({ fieldKey, shown, read, commit }: Options<T>): TypedField {
  const draft = useRunEditor((state) => state.drafts[fieldKey]);
  const setDraft = useRunEditor((state) => state.setDraft);
  const clearDraft = useRunEditor((state) => state.clearDraft);
  const [isFocused, setFocused] = useState(false);
  const [refusal, setRefusal] = useState<Refusal>(null);
  const lastTyped = useRef<string | null>(null);

  const finish = useCallback((): boolean => {
    if (draft === undefined) return true;
    lastTyped.current = draft;
    if (draft.trim() === shown.trim()) {
      clearDraft(fieldKey);
      return true;
    }
    const answer = read(draft);
    if (!answer.ok) return false;
    const refused = commit(answer.value);
    setRefusal(refused);
    if (refused !== null) return false;
    clearDraft(fieldKey);
    return true;
  }, [draft, shown, fieldKey, read, commit, clearDraft]);

  // A text that was left readable by a closed tab becomes the value when the field is shown again.
  const firstFinish = useRef(finish);
  useEffect(() => {
    firstFinish.current();
  }, [fieldKey]);

  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>) => {
    if (event.key === 'Enter') {
      finish();
      return;
    }
    if (event.key !== 'Escape') return;
    const isChanged = draft !== undefined && draft !== shown;
    const raw = lastTyped.current;
    if (isChanged) {
      event.stopPropagation();
      lastTyped.current = draft;
      setRefusal(null);
      clearDraft(fieldKey);
    } else if (raw !== null && raw !== shown) {
      event.stopPropagation();
      setDraft(fieldKey, raw);
    }
  };

  const answer = draft === undefined || isFocused ? null : read(draft);
  return {
    text: draft ?? shown,
    isFocused,
    error: answer && !answer.ok ? answer.message : isFocused ? null : refusal,
    type: (text) => {
      setRefusal(null);
      setDraft(fieldKey, text);
    },
    onFocus: () => setFocused(true),
    onBlur: () => {
      finish();
      setFocused(false);
    },
    onKeyDown,
    finish,
  };
}
