import { NativeSelect, TextInput } from '@mantine/core';
import { useForm } from '@mantine/form';
import { JOB_STATUSES, LIMITS } from '@fairlead/shared';
import type { Job, JobStatus } from '@fairlead/shared';
import { useState } from 'react';
import { useSendForm } from '../../../hooks/use-send-form';
import type { Attempt } from '../../../hooks/use-send-form';
import { useWords } from '../../../hooks/use-words';
import { formatDay } from '../../../lib/format-date';
import { textRule } from '../../../lib/text-rule';
import { FormActs } from './form-acts';
import classes from './jobs.module.css';

export interface JobValues {
  number: string;
  name: string;
  address: string;
  status: JobStatus;
  dueDate: string | null;
}

interface JobFormProps {
  /** Absent: a new job. */
  job?: Job;
  send: (values: JobValues, attempt: Attempt, baseVersion: number) => Promise<void>;
  onCancel: () => void;
}

export function JobForm({ job, send, onCancel }: JobFormProps) {
  const { say } = useWords();
  const [current, setCurrent] = useState<Job | null>(null);
  const form = useForm<Record<keyof JobValues, string>>({
    mode: 'uncontrolled',
    initialValues: {
      number: job?.number ?? '',
      name: job?.name ?? '',
      address: job?.address ?? '',
      status: job?.status ?? 'active',
      dueDate: job?.dueDate ?? '',
    },
    validate: {
      number: textRule(say, LIMITS.jobNumber, true),
      name: textRule(say, LIMITS.jobName, true),
      address: textRule(say, LIMITS.jobAddress, false),
    },
  });
  const { submit, failure, sending } = useSendForm({
    form,
    taken: { field: 'number', words: say('jobs.problem.numberTaken') },
    send: (values, attempt) =>
      send(
        {
          number: values.number.trim(),
          name: values.name.trim(),
          address: values.address.trim(),
          status: values.status as JobStatus,
          dueDate: values.dueDate || null,
        },
        attempt,
        (current ?? job)?.version ?? 0,
      ),
    onRefused: (error) => {
      if (error.code !== 'stale-version') return null;
      setCurrent(error.current as Job);
      return say('jobs.failure.stale');
    },
  });
  /** What the job holds now, beside each field another person changed while this one was open. */
  const changedTo = (name: keyof JobValues): string | undefined => {
    if (!current || !job || current[name] === job[name]) return undefined;
    const value = shown(name, current);
    return value === '' ? say('jobs.failure.staleEmpty') : say('jobs.failure.staleNow', { value });
  };
  const shown = (name: keyof JobValues, { status, dueDate, ...texts }: Job): string => {
    if (name === 'status') return say(`jobs.status.${status}`);
    if (name === 'dueDate') return dueDate === null ? '' : formatDay(dueDate);
    return texts[name] ?? '';
  };
  const field = (name: keyof JobValues) => ({
    description: changedTo(name),
    ...form.getInputProps(name),
  });
  return (
    <form className={classes.form} onSubmit={submit} noValidate>
      <TextInput
        label={say('jobs.form.number')}
        data-autofocus
        key={form.key('number')}
        {...field('number')}
      />
      <TextInput label={say('jobs.form.name')} key={form.key('name')} {...field('name')} />
      <TextInput
        label={say('jobs.form.optional', { label: say('jobs.form.address') })}
        key={form.key('address')}
        {...field('address')}
      />
      <NativeSelect
        label={say('jobs.form.status')}
        data={JOB_STATUSES.map((value) => ({ value, label: say(`jobs.status.${value}`) }))}
        key={form.key('status')}
        {...field('status')}
      />
      <TextInput
        type="date"
        label={say('jobs.form.optional', { label: say('jobs.form.dueDate') })}
        key={form.key('dueDate')}
        {...field('dueDate')}
      />
      <FormActs
        failure={failure}
        submit={say(job ? 'jobs.form.save' : 'jobs.form.create')}
        sending={sending}
        onCancel={onCancel}
      />
    </form>
  );
}
