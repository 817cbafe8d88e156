import { NativeSelect, TextInput } from '@mantine/core';
import { useForm } from '@mantine/form';
import { JOB_STATUSES, LIMITS } from '@fairlead/shared';
import type { Job, JobStatus } from '@fairlead/shared';
import { useWords } from '../../../hooks/use-words';
import { textRule } from '../state/job-problems';
import { useSendForm } from '../state/use-send-form';
import { FormActs } from './form-acts';
import classes from './jobs.module.css';

export interface JobValues {
  number: string;
  name: string;
  address: string;
  status: JobStatus;
  dueDate: string;
}

interface JobFormProps {
  /** Absent: a new job. */
  job?: Job;
  send: (values: JobValues) => Promise<void>;
  onCancel: () => void;
}

export function JobForm({ job, send, onCancel }: JobFormProps) {
  const { say } = useWords();
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
  const taken = { field: 'number', words: say('jobs.problem.numberTaken') };
  const { submit, failure, sending } = useSendForm(form, taken, (values) =>
    send({
      number: values.number.trim(),
      name: values.name.trim(),
      address: values.address.trim(),
      status: values.status as JobStatus,
      dueDate: values.dueDate,
    }),
  );
  const field = (name: keyof JobValues) => ({ key: form.key(name), ...form.getInputProps(name) });
  return (
    <form className={classes.form} onSubmit={submit} noValidate>
      <TextInput label={say('jobs.form.number')} data-autofocus {...field('number')} />
      <TextInput label={say('jobs.form.name')} {...field('name')} />
      <TextInput
        label={say('jobs.form.optional', { label: say('jobs.form.address') })}
        {...field('address')}
      />
      <NativeSelect
        label={say('jobs.form.status')}
        data={JOB_STATUSES.map((value) => ({ value, label: say(`jobs.status.${value}`) }))}
        {...field('status')}
      />
      <TextInput
        type="date"
        label={say('jobs.form.optional', { label: say('jobs.form.dueDate') })}
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
