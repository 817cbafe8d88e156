import { Button, NativeSelect, TextInput } from '@mantine/core';
import { useForm } from '@mantine/form';
import { CODE_EDITIONS, DEFAULT_SETTINGS } from '@fairlead/shared';
import type { Company } from '@fairlead/shared';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useSendForm } from '../../../hooks/use-send-form';
import { useWords } from '../../../hooks/use-words';
import { showToast } from '../../../lib/toasts';
import { companyQuery, saveSettingsMutation } from '../api/company-queries';
import { settingsRules } from './settings-rules';
import { toSettings, toValues, unitOf } from './settings-values';
import type { NumberName } from './settings-values';
import classes from './company.module.css';

const ATTACHMENTS = ['tied-head', 'basket-grip', 'eye'] as const;
const READINGS = ['never', 'mention', 'warn'] as const;
const DEFAULTS = toValues(DEFAULT_SETTINGS);

/** Limits, frictions and the edition: saved together, and every draft is judged anew. */
export function SettingsForm({ company }: { company: Company }) {
  const { say } = useWords();
  const client = useQueryClient();
  const save = useMutation(saveSettingsMutation(client));
  const mayEdit = company.can.updateSettings;
  const form = useForm({
    mode: 'uncontrolled',
    initialValues: toValues(company.settings),
    validate: settingsRules(say),
  });
  const { submit, failure, sending } = useSendForm({
    form,
    send: async (values, attempt) => {
      const settings = toSettings(values, company.settings);
      await save.mutateAsync({ attempt, body: { baseVersion: company.version, settings } });
      showToast(say('company.saved'));
    },
    onRefused: ({ code }) => (code === 'stale-version' ? say('company.failure.stale') : null),
  });
  const number = (name: NumberName) => (
    <TextInput
      label={say(`company.field.${name}`)}
      description={say('company.usual', {
        value: DEFAULTS[name] === '' ? say('company.notSet') : DEFAULTS[name],
        source: say(`company.source.${name}`),
      })}
      inputMode="decimal"
      rightSection={<span className={classes.unit}>{say(`company.unit.${unitOf(name)}`)}</span>}
      rightSectionWidth="4rem"
      disabled={!mayEdit}
      key={form.key(name)}
      {...form.getInputProps(name)}
    />
  );
  return (
    <form className={classes.form} onSubmit={submit} noValidate>
      {!mayEdit && <p className={classes.quiet}>{say('company.readOnly')}</p>}
      <section className={classes.card} aria-labelledby="code-title">
        <h2 id="code-title" className={classes.heading}>
          {say('company.code')}
        </h2>
        <div className={classes.fields}>
          <NativeSelect
            label={say('company.field.code')}
            description={say('company.source.code')}
            data={CODE_EDITIONS.map((value) => ({ value, label: value.replace('-', ' ') }))}
            disabled={!mayEdit}
            key={form.key('code')}
            {...form.getInputProps('code')}
          />
          <NativeSelect
            label={say('company.field.strictReading')}
            description={say('company.source.strictReading')}
            data={READINGS.map((value) => ({ value, label: say(`company.reading.${value}`) }))}
            disabled={!mayEdit}
            key={form.key('strictReading')}
            {...form.getInputProps('strictReading')}
          />
          {number('maxDegrees')}
        </div>
      </section>
      <section className={classes.card} aria-labelledby="limits-title">
        <h2 id="limits-title" className={classes.heading}>
          {say('company.limits')}
        </h2>
        <div className={classes.fields}>
          {(['handOne', 'handTwo', 'puller', 'rope', 'caution', 'stop'] as const).map((name) => (
            <div key={name}>{number(name)}</div>
          ))}
        </div>
      </section>
      <section className={classes.card} aria-labelledby="pulls-title">
        <h2 id="pulls-title" className={classes.heading}>
          {say('company.pulls')}
        </h2>
        <div className={classes.fields}>
          {(['low', 'likely', 'high', 'ropeFriction'] as const).map((name) => (
            <div key={name}>{number(name)}</div>
          ))}
          {(['feeding', 'pulling', 'feedTension'] as const).map((name) => (
            <div key={name}>{number(name)}</div>
          ))}
          <NativeSelect
            label={say('company.field.attachment')}
            description={say('company.source.attachment')}
            data={[
              { value: '', label: say('company.bySize') },
              ...ATTACHMENTS.map((value) => ({
                value,
                label: say(`workbench.pull.attachment.${value}`),
              })),
            ]}
            disabled={!mayEdit}
            key={form.key('attachment')}
            {...form.getInputProps('attachment')}
          />
        </div>
      </section>
      {failure && (
        <p className={classes.problem} role="alert">
          {failure}
        </p>
      )}
      {mayEdit && (
        <div className={classes.acts}>
          {failure && (
            <Button variant="default" onClick={() => void client.invalidateQueries(companyQuery())}>
              {say('company.showTheirs')}
            </Button>
          )}
          <Button type="submit" variant="filled" loading={sending}>
            {say('company.save')}
          </Button>
        </div>
      )}
    </form>
  );
}
