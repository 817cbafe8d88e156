import { BOUNDS, conditionsInForce } from '@fairlead/shared';
import type { PullConditions, WordKey } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import fieldClasses from '../fields/fields.module.css';
import { NumberField } from '../fields/number-field';
import { SelectField } from '../fields/select-field';
import { useEdit } from '../hooks/use-edit';
import { useSettings } from '../hooks/use-settings';
import classes from './pull.module.css';

const FRICTIONS = ['low', 'likely', 'high'] as const;
const CREW = ['feeding', 'pulling'] as const;
const ATTACHMENTS = ['tied-head', 'basket-grip', 'eye'] as const;
const FORCES = ['puller', 'rope', 'handOne', 'handTwo'] as const;
const SIDEWALLS = ['caution', 'stop'] as const;

const PREFIX = '/conditions/';

/** What this run is pulled with. An empty field means the usual value, which stands in it greyed. */
export function PullConditionsCard() {
  const { say } = useWords();
  const document = useRunEditor((state) => state.document);
  const canEdit = useRunEditor((state) => state.canEdit);
  const assumed = useRunEditor((state) => state.analysis.assumed);
  const settings = useSettings();
  const edit = useEdit();
  const { conditions = {}, conductors = [] } = document;
  const usual = conditionsInForce({ ...document, conditions: undefined }, settings, conductors);
  const limits = conditions.limits ?? {};

  const set = (change: Partial<PullConditions>) =>
    edit([{ command: 'set-conditions', args: { conditions: { ...conditions, ...change } } }]);
  const setLimits = (change: Partial<NonNullable<PullConditions['limits']>>) => {
    const next = Object.entries({ ...limits, ...change }).filter(
      ([, value]) => value !== undefined && value !== null,
    );
    return set({ limits: next.length > 0 ? Object.fromEntries(next) : undefined });
  };
  const shared = { isOptional: true, min: 0, disabled: !canEdit } as const;
  const feed = conditions.feedTension;
  return (
    <section className={classes.card} aria-labelledby="conditions-title">
      <h2 id="conditions-title" className={classes.title}>
        {say('workbench.pull.conditions')}
      </h2>
      <div className={classes.fields}>
        {FRICTIONS.map((level) => (
          <NumberField
            key={level}
            {...shared}
            label={say(`workbench.pull.condition.${level}`)}
            fieldKey={`conditions.friction.${level}`}
            value={conditions.friction?.[level] ?? null}
            placeholder={String(usual.friction[level])}
            unit={say('workbench.pull.noUnit')}
            max={BOUNDS.friction}
            onCommit={(value) =>
              set({
                friction:
                  value === null
                    ? undefined
                    : { ...(conditions.friction ?? usual.friction), [level]: value },
              })
            }
          />
        ))}
        <NumberField
          {...shared}
          label={say('workbench.pull.condition.ropeFriction')}
          fieldKey="conditions.ropeFriction"
          value={conditions.ropeFriction ?? null}
          placeholder={String(usual.ropeFriction)}
          unit={say('workbench.pull.noUnit')}
          max={BOUNDS.friction}
          onCommit={(value) => set({ ropeFriction: value ?? undefined })}
        />
        {CREW.map((part) => (
          <NumberField
            key={part}
            {...shared}
            isWhole
            label={say(`workbench.pull.condition.${part}`)}
            fieldKey={`conditions.crew.${part}`}
            value={conditions.crew?.[part] ?? null}
            placeholder={String(usual.crew[part])}
            unit={say('workbench.pull.people')}
            max={BOUNDS.people}
            onCommit={(value) =>
              set({
                crew:
                  value === null
                    ? undefined
                    : { ...(conditions.crew ?? usual.crew), [part]: value },
              })
            }
          />
        ))}
        <NumberField
          {...shared}
          label={say('workbench.pull.condition.feedTension')}
          fieldKey="conditions.feedTension"
          value={typeof feed === 'number' ? feed : (feed?.from ?? null)}
          placeholder={String(usual.feedTension.from)}
          unit={say('workbench.pull.pounds')}
          max={BOUNDS.force}
          onCommit={(value) => set({ feedTension: value ?? undefined })}
        />
        <SelectField
          label={say('workbench.pull.condition.attachment')}
          value={conditions.attachment ?? ''}
          options={[
            {
              value: '' as const,
              label: say('workbench.pull.usualAttachment', {
                value: say(`workbench.pull.attachment.${usual.attachment}`),
              }),
            },
            ...ATTACHMENTS.map((value) => ({
              value,
              label: say(`workbench.pull.attachment.${value}`),
            })),
          ]}
          disabled={!canEdit}
          onChange={(value) => void set({ attachment: value === '' ? undefined : value })}
        />
        {FORCES.map((limit) => (
          <NumberField
            key={limit}
            {...shared}
            label={say(`workbench.pull.condition.${limit}`)}
            fieldKey={`conditions.limits.${limit}`}
            value={limits[limit] ?? null}
            placeholder={
              usual.limits[limit] === null
                ? say('workbench.pull.unset')
                : String(usual.limits[limit])
            }
            unit={say('workbench.pull.pounds')}
            max={BOUNDS.force}
            onCommit={(value) => setLimits({ [limit]: value ?? undefined })}
          />
        ))}
        {SIDEWALLS.map((limit) => (
          <NumberField
            key={limit}
            {...shared}
            label={say(`workbench.pull.condition.${limit}`)}
            fieldKey={`conditions.limits.sidewall.${limit}`}
            value={limits.sidewall?.[limit] ?? null}
            placeholder={String(usual.limits.sidewall[limit])}
            unit={say('workbench.pull.poundsPerFoot')}
            max={BOUNDS.force}
            onCommit={(value) => {
              const sidewall = { ...limits.sidewall, [limit]: value ?? undefined };
              const isGiven = Object.values(sidewall).some(
                (each) => each !== undefined && each !== null,
              );
              return setLimits({ sidewall: isGiven ? sidewall : undefined });
            }}
          />
        ))}
      </div>
      <details className={classes.profile}>
        <summary className={fieldClasses.textButton}>{say('workbench.pull.sources')}</summary>
        <ul className={classes.sources}>
          {assumed
            .filter(({ path }) => path.startsWith(PREFIX))
            .map(({ path, source }) => (
              <li key={path}>
                {say('workbench.pull.source', {
                  what: say(`workbench.pull.sourceOf.${path.slice(PREFIX.length)}` as WordKey),
                  source,
                })}
              </li>
            ))}
        </ul>
      </details>
    </section>
  );
}
