import { formatAngle, formatLength } from '@fairlead/shared';
import type { Direction, Raceway } from '@fairlead/shared';
import type { Say } from '../../../../hooks/use-words';
import type { ConflictField } from '../../state/run-editor-state';
import { wordDirection } from './word-direction';
import { wordRaceway } from './word-piece';

const LENGTHS = new Set([
  'length',
  'rise',
  'height',
  'width',
  'radius',
  'makeUp',
  'depth',
  'bendRadius',
  'sheaveRadius',
  'maxSectionLength',
  'minBendRadius',
  'od',
]);
const ANGLES = new Set(['angle', 'degrees', 'maxDegrees', 'azimuth', 'elevation']);

/** Fields with a word of their own; any other is told by its name in the document. */
const FIELD_WORDS = {
  angle: 'angle',
  rise: 'rise',
  height: 'height',
  width: 'width',
  length: 'length',
  degrees: 'degrees',
  radius: 'radius',
  bendRadius: 'radius',
  toward: 'toward',
  label: 'label',
  device: 'device',
  accessible: 'accessible',
  body: 'body',
  makeUp: 'makeUp',
  reach: 'reach',
  place: 'place',
  boxSize: 'boxSize',
  made: 'made',
  counts: 'counts',
  why: 'why',
  raceway: 'raceway',
  fitting: 'fitting',
  turn: 'turn',
  tradeSize: 'tradeSize',
} as const;

function isNamed(field: string): field is keyof typeof FIELD_WORDS {
  return Object.hasOwn(FIELD_WORDS, field);
}

/** "9. Offset 10″, angle", or the field alone for the run itself. */
export function wordConflictField(
  { elementId, field, pointer }: ConflictField,
  labelOf: (elementId: string) => string,
  say: Say,
): string {
  if (pointer === '/path') return say('workbench.conflict.order');
  const name =
    field === null
      ? say('workbench.conflict.piece')
      : isNamed(field)
        ? say(`workbench.field.${FIELD_WORDS[field]}`)
        : field;
  const place = elementId === null ? '' : labelOf(elementId);
  if (elementId === null && field === null) return pointer;
  return place ? say('workbench.conflict.placeField', { place, field: name }) : name;
}

function isObject(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null;
}

/** A value in words, with its unit. */
export function wordConflictValue(field: ConflictField, value: unknown, say: Say): string {
  if (Array.isArray(value)) return say('workbench.conflict.otherOrder', { count: value.length });
  if (value === undefined || value === null) return say('workbench.conflict.absent');
  if (typeof value === 'boolean') return say(value ? 'workbench.field.yes' : 'workbench.field.no');
  const name = field.field ?? '';
  if (typeof value === 'number') {
    if (LENGTHS.has(name)) return formatLength(value);
    if (ANGLES.has(name)) return formatAngle(value);
    return String(value);
  }
  if (name === 'toward' || name === 'heading') return wordDirection(value as Direction, say);
  if (isObject(value) && 'type' in value && 'tradeSize' in value) {
    return wordRaceway(value as unknown as Raceway, say);
  }
  if (field.field === null) return say('workbench.conflict.there');
  return typeof value === 'string' ? value : JSON.stringify(value);
}
