import { BOUNDS } from '@fairlead/shared';
import type { Say } from '../../../hooks/use-words';
import { CREW, FIELDS, OPTIONAL, unitOf } from './settings-values';
import type { NumberName, SettingsValues } from './settings-values';

type Rule = (value: string, values: SettingsValues) => string | null;

const MOST: Record<ReturnType<typeof unitOf>, number> = {
  friction: BOUNDS.friction,
  people: BOUNDS.people,
  pounds: BOUNDS.force,
  poundsPerFoot: BOUNDS.force,
  degrees: BOUNDS.maxDegrees,
};
/** Fields that are never below another one. */
const AT_LEAST: Partial<Record<NumberName, NumberName>> = {
  likely: 'low',
  high: 'likely',
  handTwo: 'handOne',
};

/** What the form can say before it asks the server; the server checks again. */
export function settingsRules(say: Say): Record<NumberName, Rule> {
  const rule =
    (name: NumberName): Rule =>
    (typed, values) => {
      const text = typed.trim().replace(',', '.');
      if (text === '') return OPTIONAL.includes(name) ? null : say('app.problem.required');
      const value = Number(text);
      const unit = unitOf(name);
      const least = unit === 'friction' || unit === 'people' || name === 'feedTension' ? 0 : 1e-6;
      if (!Number.isFinite(value) || value < least || value > MOST[unit]) {
        return say('company.problem.range', { max: MOST[unit] });
      }
      if (CREW.includes(name) && !Number.isInteger(value)) return say('company.problem.whole');
      const other = AT_LEAST[name];
      return other && value < Number(values[other])
        ? say('company.problem.order', { field: say(`company.field.${other}`) })
        : null;
    };
  return Object.fromEntries(FIELDS.map((name) => [name, rule(name)])) as Record<NumberName, Rule>;
}
