import type { ApiError } from '@fairlead/shared';
import type { UseFormReturnType } from '@mantine/form';
import { useRef, useState } from 'react';
import { failureWords } from '../lib/failure-words';
import { problemsByField } from '../lib/field-problems';
import { newId } from '../lib/ids';
import { failureOf } from '../lib/request-error';
import { useWords } from './use-words';

/** Names one try: sent again before it was answered it keeps both, so a lost answer never makes a second row. */
export interface Attempt {
  id: string;
  key: string;
}

interface SendForm<Values> {
  form: UseFormReturnType<Values>;
  send: (values: Values, attempt: Attempt) => Promise<void>;
  /** The field that must be unique, and what it says when it is not. */
  taken?: { field: string; words: string };
  /** Words for a refusal this form answers itself; null: the usual words. */
  onRefused?: (error: ApiError) => string | null;
}

/** Sends a form once at a time; the server's problems go beside their fields, the rest above the button. */
export function useSendForm<Values extends Record<string, string>>({
  form,
  send,
  taken,
  onRefused,
}: SendForm<Values>) {
  const { say } = useWords();
  const [failure, setFailure] = useState<string | null>(null);
  const [sending, setSending] = useState(false);
  const unanswered = useRef<(Attempt & { typed: string }) | null>(null);

  const attemptAt = (values: Values): Attempt => {
    const typed = JSON.stringify(values);
    if (unanswered.current?.typed !== typed) {
      unanswered.current = { typed, id: newId(), key: newId() };
    }
    return unanswered.current;
  };
  const beside = (error: ApiError, values: Values): Record<string, string> => {
    if (taken && error.code === 'already-exists') return { [taken.field]: taken.words };
    const problems = problemsByField(error);
    return Object.fromEntries(
      Object.keys(values)
        .filter((field) => problems.has(field))
        .map((field) => [field, say('app.problem.refused')]),
    );
  };
  const submit = form.onSubmit(
    async (values) => {
      if (sending) return;
      setSending(true);
      setFailure(null);
      try {
        await send(values, attemptAt(values));
      } catch (error) {
        const failed = failureOf(error);
        if (!failed) throw error;
        if (failed.kind === 'network' || failed.error.status >= 500) {
          setFailure(failureWords(failed, say));
          return;
        }
        unanswered.current = null;
        const problems = beside(failed.error, values);
        if (Object.keys(problems).length > 0) form.setErrors(problems);
        else setFailure(onRefused?.(failed.error) ?? failureWords(failed, say));
      } finally {
        setSending(false);
      }
    },
    (problems) => form.getInputNode(Object.keys(problems)[0] ?? '')?.focus(),
  );
  return { submit, failure, sending };
}
