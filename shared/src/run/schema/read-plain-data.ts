import type { Problem } from '../../contracts/errors';
import { LIMITS } from '../../contracts/limits';
import { pointerStep, shortened, shownFound } from './problem-text';

/** A document of the largest size allowed holds at most one value in every two bytes. */
const MOST_VALUES = LIMITS.documentBytes / 2;
const LONGEST_KEY = 64;
/** Names that reach a prototype instead of a field when a careless reader assigns by key. */
const FORBIDDEN_KEYS = new Set(['__proto__', 'constructor', 'prototype']);

/** Stands where a value could not be read, so that the schema does not speak of that place again. */
const UNREADABLE = Symbol('unreadable');

export interface PlainData {
  value: unknown;
  problems: Problem[];
}

type Holder = Record<string, unknown> | unknown[];
interface Place {
  source: unknown;
  holder: Holder;
  key: string | number;
  pointer: string;
  /** How many objects and lists stand around it. */
  depth: number;
}

/**
 * A deep copy of whatever was handed in, holding only what JSON can: null, booleans, finite numbers, strings, lists,
 * plain objects. Everything else is a problem at its pointer. It runs no getter, follows no prototype and keeps its own
 * stack, so neither depth, cycles, shared branches nor hostile objects can make it overflow, hang or run foreign code.
 */
export function readPlainData(input: unknown): PlainData {
  const root: { value?: unknown } = {};
  const problems: Problem[] = [];
  const places: Place[] = [
    { source: input, holder: root as Holder, key: 'value', pointer: '', depth: 0 },
  ];
  let values = 0;
  for (let place = places.pop(); place; place = places.pop()) {
    if ((values += 1) > MOST_VALUES) {
      const tooMany = { found: values, allowed: { atMost: MOST_VALUES } };
      return {
        value: UNREADABLE,
        problems: [{ pointer: '', code: 'too-many-values', ...tooMany }],
      };
    }
    setValue(place, readValue(place, places, problems));
  }
  return { value: root.value, problems };
}

function setValue({ holder, key }: Place, value: unknown): void {
  (holder as Record<string | number, unknown>)[key] = value;
}

function readValue(place: Place, places: Place[], problems: Problem[]): unknown {
  const { source, pointer, depth } = place;
  const refuse = (code: string, found: unknown, allowed: unknown): symbol => {
    problems.push({ pointer, code, found, allowed });
    return UNREADABLE;
  };
  if (source === null || typeof source === 'string' || typeof source === 'boolean') return source;
  if (typeof source === 'number') {
    return Number.isFinite(source)
      ? source
      : refuse('not-finite', shownFound(source), 'finite number');
  }
  if (typeof source !== 'object') return refuse('not-plain-data', shownFound(source), 'JSON value');
  if (depth >= LIMITS.depth) return refuse('too-deep', depth + 1, { atMost: LIMITS.depth });
  try {
    if (Array.isArray(source)) {
      return source.length > LIMITS.elements
        ? refuse('too-many', source.length, { atMost: LIMITS.elements })
        : readList(source, place, places, problems);
    }
    return isPlain(source)
      ? readObject(source, place, places, problems)
      : refuse('not-plain-data', 'object', 'plain object');
  } catch {
    return refuse('not-plain-data', 'object', 'plain object');
  }
}

/** True for an object literal of any realm: nothing, or one root prototype, stands behind it. */
function isPlain(source: object): boolean {
  const prototype: unknown = Object.getPrototypeOf(source);
  return prototype === null || Object.getPrototypeOf(prototype) === null;
}

function readList(
  source: readonly unknown[],
  { pointer, depth }: Place,
  places: Place[],
  problems: Problem[],
): unknown[] {
  const list: unknown[] = new Array(source.length).fill(UNREADABLE);
  // Pushed backwards: the stack then reads, and reports, from the first to the last.
  for (let index = source.length - 1; index >= 0; index -= 1) {
    const property = Object.getOwnPropertyDescriptor(source, index);
    const at = pointer + pointerStep(index);
    if (property && 'value' in property && property.value !== undefined) {
      places.push({
        source: property.value,
        holder: list,
        key: index,
        pointer: at,
        depth: depth + 1,
      });
    } else {
      problems.push({ pointer: at, code: 'missing', found: null, allowed: 'JSON value' });
    }
  }
  return list;
}

function readObject(
  source: object,
  { pointer, depth }: Place,
  places: Place[],
  problems: Problem[],
): Record<string, unknown> {
  const copy: Record<string, unknown> = {};
  if (Object.getOwnPropertySymbols(source).length > 0) {
    problems.push({ pointer, code: 'not-plain-data', found: 'symbol', allowed: 'plain object' });
  }
  for (const key of Object.keys(source).reverse()) {
    const at = pointer + pointerStep(key);
    if (key.length > LONGEST_KEY) {
      problems.push({ pointer, code: 'unknown-key', found: shortened(key), allowed: null });
      continue;
    }
    if (FORBIDDEN_KEYS.has(key)) {
      problems.push({ pointer: at, code: 'forbidden-key', found: key, allowed: null });
      continue;
    }
    const property = Object.getOwnPropertyDescriptor(source, key);
    if (!property || !('value' in property)) {
      problems.push({
        pointer: at,
        code: 'not-plain-data',
        found: 'getter',
        allowed: 'JSON value',
      });
    } else if (property.value !== undefined) {
      // A field set to undefined is a field not given: that is how JSON would write it.
      places.push({ source: property.value, holder: copy, key, pointer: at, depth: depth + 1 });
    }
  }
  return copy;
}
