import { BOUNDS, CODE_EDITIONS, LIMITS } from '@fairlead/shared';
import type { RuleOverrides, Rules } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { AngleField } from '../fields/angle-field';
import fieldClasses from '../fields/fields.module.css';
import { LengthField } from '../fields/length-field';
import { NumberField } from '../fields/number-field';
import { SelectField } from '../fields/select-field';
import { TextField } from '../fields/text-field';
import { useEdit } from '../hooks/use-edit';
import { editionOf, wordEdition } from '../model/word-rules';
import classes from './dialogs.module.css';

/** A copy without what is not given; nothing left counts as not given. */
function given<T extends object>(value: T): T | undefined {
  const entries = Object.entries(value).filter(([, field]) => field !== undefined);
  return entries.length === 0 ? undefined : (Object.fromEntries(entries) as T);
}

export function RulesForm() {
  const { say } = useWords();
  const document = useRunEditor((state) => state.document);
  const assumed = useRunEditor((state) => state.analysis.assumed);
  const canEdit = useRunEditor((state) => state.canEdit);
  const edit = useEdit();
  const rules = document.rules ?? {};
  const overrides = rules.overrides ?? {};
  const taken = editionOf({ rules: { ...rules, code: undefined } }, assumed);

  const setRules = (change: Partial<Rules>) =>
    edit([{ command: 'set-rules', args: { rules: given({ ...rules, ...change }) ?? {} } }]);
  const setOverride = (change: Partial<RuleOverrides>) =>
    setRules({ overrides: given({ ...overrides, ...change }) });
  return (
    <div className={classes.form}>
      <div className={fieldClasses.rowWide}>
        <SelectField
          label={say('workbench.rules.edition')}
          value={rules.code ?? ''}
          options={[
            {
              value: '' as const,
              label: say('workbench.rules.companyLimit', {
                value: taken === null ? '' : wordEdition(taken, say),
              }),
            },
            ...CODE_EDITIONS.map((value) => ({ value, label: wordEdition(value, say) })),
          ]}
          disabled={!canEdit}
          onChange={(code) => void setRules({ code: code === '' ? undefined : code })}
        />
        <SelectField
          label={say('workbench.rules.profile')}
          value={rules.profile ?? 'power'}
          options={(['power', 'telecom'] as const).map((value) => ({
            value,
            label: say(`workbench.rules.${value}`),
          }))}
          disabled={!canEdit}
          onChange={(profile) => void setRules({ profile })}
        />
      </div>
      <p className={classes.lead}>{say('workbench.rules.limits')}</p>
      <div className={fieldClasses.rowWide}>
        <AngleField
          label={say('workbench.rules.maxDegrees')}
          fieldKey="rules.maxDegrees"
          value={overrides.maxDegrees ?? null}
          max={BOUNDS.maxDegrees}
          isOptional
          placeholder={say('workbench.field.notGiven')}
          disabled={!canEdit}
          onCommit={(maxDegrees) => setOverride({ maxDegrees: maxDegrees ?? undefined })}
        />
        <LengthField
          label={say('workbench.rules.maxSectionLength')}
          fieldKey="rules.maxSectionLength"
          value={overrides.maxSectionLength ?? null}
          max={BOUNDS.length}
          isOptional
          placeholder={say('workbench.field.notGiven')}
          disabled={!canEdit}
          onCommit={(length) => setOverride({ maxSectionLength: length ?? undefined })}
        />
        <NumberField
          label={say('workbench.rules.maxFillPercent')}
          fieldKey="rules.maxFillPercent"
          value={overrides.maxFillPercent ?? null}
          unit={say('workbench.number.unitPercent')}
          min={1}
          max={BOUNDS.percent}
          isOptional
          placeholder={say('workbench.field.notGiven')}
          disabled={!canEdit}
          onCommit={(percent) => setOverride({ maxFillPercent: percent ?? undefined })}
        />
        <LengthField
          label={say('workbench.rules.minBendRadius')}
          fieldKey="rules.minBendRadius"
          value={overrides.minBendRadius ?? null}
          max={BOUNDS.dimension}
          isOptional
          placeholder={say('workbench.field.notGiven')}
          disabled={!canEdit}
          onCommit={(radius) => setOverride({ minBendRadius: radius ?? undefined })}
        />
      </div>
      <TextField
        label={say('workbench.rules.source')}
        fieldKey="rules.source"
        value={overrides.source ?? ''}
        maxLength={LIMITS.source}
        help={say('workbench.rules.sourceHint')}
        disabled={!canEdit}
        onCommit={(source) => setOverride({ source: source === '' ? undefined : source })}
      />
    </div>
  );
}
