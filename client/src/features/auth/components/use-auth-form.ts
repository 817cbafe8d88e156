import type { UseFormInput } from '@mantine/form';
import { useForm } from '@mantine/form';
import { useState } from 'react';
import { useWords } from '../../../hooks/use-words';
import { failureOf } from '../../../lib/request-error';
import { failureWords, serverProblems } from './auth-rules';

/** A form that sends once at a time, puts the server's problems beside their fields and the rest above the button. */
export function useAuthForm<Values extends Record<string, string>>(
  input: UseFormInput<Values>,
  send: (values: Values) => Promise<void>,
) {
  const { say } = useWords();
  const form = useForm<Values>({ mode: 'uncontrolled', ...input });
  const [failure, setFailure] = useState<string | null>(null);
  const [sending, setSending] = useState(false);

  const submit = form.onSubmit(
    async (values) => {
      if (sending) return;
      setSending(true);
      setFailure(null);
      try {
        await send(values);
      } catch (error) {
        const failed = failureOf(error);
        if (!failed) throw error;
        const fields = Object.keys(values);
        const problems = failed.kind === 'api' ? serverProblems(failed.error, fields, say) : {};
        if (Object.keys(problems).length > 0) form.setErrors(problems);
        else setFailure(failureWords(failed, say));
      } finally {
        setSending(false);
      }
    },
    (problems) => form.getInputNode(Object.keys(problems)[0] ?? '')?.focus(),
  );
  return { form, submit, failure, sending };
}
