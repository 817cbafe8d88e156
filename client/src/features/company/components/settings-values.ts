import type { CompanySettings } from '@fairlead/shared';

/** The settings as a form holds them: text, empty where nothing is set. */
export const FIELDS = [
  'low',
  'likely',
  'high',
  'ropeFriction',
  'feeding',
  'pulling',
  'feedTension',
  'handOne',
  'handTwo',
  'puller',
  'rope',
  'caution',
  'stop',
  'maxDegrees',
] as const;
export type NumberName = (typeof FIELDS)[number];
export type SettingsValues = Record<NumberName | 'code' | 'strictReading' | 'attachment', string>;

/** Fields that may stay empty: nothing is set then. */
export const OPTIONAL: readonly NumberName[] = ['feedTension', 'puller', 'rope', 'maxDegrees'];
const FRICTIONS: readonly NumberName[] = ['low', 'likely', 'high', 'ropeFriction'];
export const CREW: readonly NumberName[] = ['feeding', 'pulling'];

export const unitOf = (name: NumberName) => {
  if (name === 'maxDegrees') return 'degrees';
  if (FRICTIONS.includes(name)) return 'friction';
  if (CREW.includes(name)) return 'people';
  return name === 'caution' || name === 'stop' ? 'poundsPerFoot' : 'pounds';
};

export function toValues({
  code,
  strictReading,
  maxDegrees,
  pull,
}: CompanySettings): SettingsValues {
  const text = (value: number | null) => (value === null ? '' : String(value));
  const { friction, crew, limits } = pull;
  return {
    code,
    strictReading,
    attachment: pull.attachment ?? '',
    maxDegrees: text(maxDegrees),
    low: text(friction.low),
    likely: text(friction.likely),
    high: text(friction.high),
    ropeFriction: text(pull.ropeFriction),
    feeding: text(crew.feeding),
    pulling: text(crew.pulling),
    feedTension: text(pull.feedTension),
    handOne: text(limits.handOne),
    handTwo: text(limits.handTwo),
    puller: text(limits.puller),
    rope: text(limits.rope),
    caution: text(limits.sidewall.caution),
    stop: text(limits.sidewall.stop),
  };
}

/** What the form says, over settings it does not show. The rules of the fields have passed by then. */
export function toSettings(values: SettingsValues, before: CompanySettings): CompanySettings {
  const number = (name: NumberName) => Number(values[name]);
  const some = (name: NumberName) => (values[name].trim() === '' ? null : number(name));
  return {
    ...before,
    code: values.code as CompanySettings['code'],
    strictReading: values.strictReading as CompanySettings['strictReading'],
    maxDegrees: some('maxDegrees'),
    pull: {
      friction: { low: number('low'), likely: number('likely'), high: number('high') },
      ropeFriction: number('ropeFriction'),
      crew: { feeding: number('feeding'), pulling: number('pulling') },
      feedTension: some('feedTension'),
      attachment:
        values.attachment === ''
          ? null
          : (values.attachment as CompanySettings['pull']['attachment']),
      limits: {
        handOne: number('handOne'),
        handTwo: number('handTwo'),
        puller: some('puller'),
        rope: some('rope'),
        sidewall: { caution: number('caution'), stop: number('stop') },
      },
    },
  };
}
