import { NativeSelect, TextInput } from '@mantine/core';
import { useForm } from '@mantine/form';
import {
  LIMITS,
  RACEWAY_TYPES,
  RUN_FORMAT,
  RUN_VERSION,
  numberElements,
  pullPoint,
  tradeSizesOf,
} from '@fairlead/shared';
import type { RacewayType, RunDocument, TradeSize } from '@fairlead/shared';
import { useSendForm } from '../../../hooks/use-send-form';
import type { Attempt } from '../../../hooks/use-send-form';
import { useWords } from '../../../hooks/use-words';
import { textRule } from '../../../lib/text-rule';
import { FormActs } from './form-acts';
import classes from './jobs.module.css';

interface LayOutRunFormProps {
  send: (document: RunDocument, attempt: Attempt) => Promise<void>;
  onCancel: () => void;
}

const START = { tag: '', title: '', from: '', to: '', type: 'EMT', tradeSize: '3/4' };

/** Two ends and the pipe between them: everything else is drawn. */
function documentOf(values: typeof START): RunDocument {
  const end = (label: string) => pullPoint(label.trim() === '' ? {} : { label: label.trim() });
  const document: RunDocument = {
    format: RUN_FORMAT,
    version: RUN_VERSION,
    tag: values.tag.trim(),
    raceway: { type: values.type as RacewayType, tradeSize: values.tradeSize as TradeSize },
    path: [],
  };
  if (values.title.trim() !== '') document.title = values.title.trim();
  return { ...document, path: numberElements(document, [end(values.from), end(values.to)]) };
}

export function LayOutRunForm({ send, onCancel }: LayOutRunFormProps) {
  const { say } = useWords();
  const form = useForm({
    initialValues: START,
    validate: {
      tag: textRule(say, LIMITS.tag, true),
      title: textRule(say, LIMITS.title, false),
      from: textRule(say, LIMITS.label, false),
      to: textRule(say, LIMITS.label, false),
    },
  });
  const { submit, failure, sending } = useSendForm({
    form,
    taken: { field: 'tag', words: say('jobs.runs.new.tagTaken') },
    send: (values, attempt) => send(documentOf(values), attempt),
  });
  const sizes = tradeSizesOf(form.values.type as RacewayType);

  const chooseType = (type: string) => {
    const known: string[] = tradeSizesOf(type as RacewayType);
    const { tradeSize } = form.values;
    form.setValues({ type, tradeSize: known.includes(tradeSize) ? tradeSize : (known[0] ?? '') });
  };
  return (
    <form className={classes.form} onSubmit={submit} noValidate>
      <TextInput
        label={say('jobs.runs.new.tag')}
        description={say('jobs.runs.new.tagHint')}
        data-autofocus
        {...form.getInputProps('tag')}
      />
      <TextInput
        label={say('jobs.form.optional', { label: say('jobs.runs.new.runTitle') })}
        {...form.getInputProps('title')}
      />
      <TextInput
        label={say('jobs.runs.new.from')}
        description={say('jobs.runs.new.fromHint')}
        {...form.getInputProps('from')}
      />
      <TextInput
        label={say('jobs.runs.new.to')}
        description={say('jobs.runs.new.toHint')}
        {...form.getInputProps('to')}
      />
      <NativeSelect
        label={say('jobs.runs.new.racewayType')}
        data={[...RACEWAY_TYPES]}
        value={form.values.type}
        onChange={(event) => chooseType(event.currentTarget.value)}
      />
      <NativeSelect
        label={say('jobs.runs.new.tradeSize')}
        data={sizes}
        {...form.getInputProps('tradeSize')}
      />
      <FormActs
        failure={failure}
        submit={say('jobs.runs.new.submit')}
        sending={sending}
        onCancel={onCancel}
      />
    </form>
  );
}
