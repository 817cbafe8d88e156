import type { Finding } from '../contracts/run-analysis';
import { formatAngle } from '../units/format-angle';
import { formatForce, formatLimit } from '../units/format-force';
import { formatLength } from '../units/format-length';
import { formatPercentBeside } from '../units/format-percent';
import type { Say } from './create-words';
import type { WordKey } from './word-key';

/** What wording needs: the words, and what each place of the run is called. */
export interface WordingContext {
  say: Say;
  /** An element's name as the list shows it; a section goes by its first pull point's id. */
  labelOf: (elementId: string) => string;
}

type Figures = Finding['values'];
type Shown = Record<string, string | number>;

const ANGLES = new Set(
  'degrees limit over strict without with codeLimit remaining angle practice'.split(' '),
);
const LENGTHS = new Set(
  'leg needed short height lowest clearance bore diameter radius minimum length added station'.split(
    ' ',
  ),
);
const RATIOS = new Set(['ratio', 'ratioWithOvality']);

/** Checks whose figures are forces, lbf, or sidewall pressures, lb/ft. */
const BY_FORCE = new Set(['tension', 'sidewall']);
const EXACT = new Set('allowed caution stop strength needed puller'.split(' '));

/** Checks whose `limit`, `over` and `length` are lengths, not degrees. */
const BY_LENGTH = new Set(['length']);

/**
 * Figures as text, each by what its name measures: angles, lengths, ratios to 0.01, a percent beside its limit.
 *
 * @example shownFigures({ degrees: 380, over: 20 }, 'degrees') // { degrees: '380°', over: '20°' }
 */
export function shownFigures(values: Figures, subject: string): Shown {
  const shown: Shown = {};
  const ofPull = BY_FORCE.has(subject);
  for (const [name, value] of Object.entries(values)) {
    if (typeof value === 'string') shown[name] = value;
    if (typeof value !== 'number') continue;
    if (ofPull) shown[name] = shownForce(name, value, values);
    else shown[name] = shownFigure(name, value, BY_LENGTH.has(subject));
  }
  const { percent, limitPercent } = values;
  if (typeof percent === 'number' && typeof limitPercent === 'number') {
    shown.percentOfLimit = formatPercentBeside(percent, limitPercent);
  }
  return shown;
}

/** Limits exactly, predictions rounded and never onto their limit, frictions to 0.01. */
function shownForce(name: string, value: number, values: Figures): string {
  if (name === 'friction') return value.toFixed(2);
  if (EXACT.has(name)) return formatLimit(value);
  const limit = values.allowed ?? values.stop;
  return formatForce(value, typeof limit === 'number' ? limit : null);
}

function shownFigure(name: string, value: number, byLength: boolean): string | number {
  if (byLength && (name === 'limit' || name === 'over')) return toInch(value);
  if (name === 'length') return toInch(value);
  if (ANGLES.has(name)) return formatAngle(value);
  if (LENGTHS.has(name)) return formatLength(value, { to: 16 });
  if (RATIOS.has(name)) return value.toFixed(2);
  return value;
}

/** A limit of a pull by its name, "conductors"; empty for every other limit. */
export function pullLimitName({ limit }: Figures, say: Say): string {
  return typeof limit === 'string' ? say(`findings.pullLimit.${limit}` as WordKey) : '';
}

/** Long lengths read to the inch. */
export const toInch = (inches: number): string => formatLength(inches, { to: 1 });
