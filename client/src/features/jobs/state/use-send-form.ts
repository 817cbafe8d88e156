import type { UseFormReturnType } from '@mantine/form';
import { useState } from 'react';
import { useWords } from '../../../hooks/use-words';
import { failureOf } from '../../../lib/request-error';
import { failureWords, fieldProblems } from './job-problems';

/** Sends a form once at a time; the server's problems go beside their fields, the rest above the button. */
export function useSendForm<Values extends Record<string, string>>(
  form: UseFormReturnType<Values>,
  taken: { field: string; words: string },
  send: (values: Values) => Promise<void>,
) {
  const { say } = useWords();
  const [failure, setFailure] = useState<string | null>(null);
  const [sending, setSending] = useState(false);

  const submit = form.onSubmit(async (values) => {
    if (sending) return;
    setSending(true);
    setFailure(null);
    try {
      await send(values);
    } catch (error) {
      const failed = failureOf(error);
      if (!failed) throw error;
      const fields = Object.keys(values);
      const problems = failed.kind === 'api' ? fieldProblems(failed.error, fields, taken, say) : {};
      if (Object.keys(problems).length > 0) form.setErrors(problems);
      else setFailure(failureWords(failed, say));
    } finally {
      setSending(false);
    }
  });
  return { submit, failure, sending };
}
