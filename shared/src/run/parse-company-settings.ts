import * as z from 'zod/mini';
import type { Problem } from '../contracts/errors';
import type { CompanySettings } from '../contracts/settings';
import { BOUNDS } from './document-bounds';
import { CODE_EDITIONS, RACEWAY_TYPES, TRADE_SIZES } from './run-document';
import { asNumber, asObject } from './schema/loose';
import { dimension, positive, whole, zeroOrMore } from './schema/primitives';
import { pointerOf } from './schema/problem-text';
import { readPlainData } from './schema/read-plain-data';
import { schemaProblems } from './schema/schema-problems';

const force = positive(BOUNDS.force);
const friction = zeroOrMore(BOUNDS.friction);

const settingsShape = z.strictObject({
  code: z.enum(CODE_EDITIONS),
  strictReading: z.enum(['never', 'mention', 'warn']),
  maxDegrees: z.nullable(positive(BOUNDS.maxDegrees)),
  benders: z
    .array(
      z.strictObject({
        type: z.enum(RACEWAY_TYPES),
        tradeSize: z.enum(TRADE_SIZES),
        radius: dimension,
      }),
    )
    .check(z.maxLength(RACEWAY_TYPES.length * TRADE_SIZES.length)),
  pull: z.strictObject({
    friction: z.strictObject({ low: friction, likely: friction, high: friction }),
    ropeFriction: friction,
    crew: z.strictObject({ feeding: whole(0, BOUNDS.people), pulling: whole(0, BOUNDS.people) }),
    feedTension: z.nullable(zeroOrMore(BOUNDS.force)),
    attachment: z.nullable(z.enum(['eye', 'basket-grip', 'tied-head'])),
    limits: z.strictObject({
      handOne: force,
      handTwo: force,
      puller: z.nullable(force),
      rope: z.nullable(force),
      sidewall: z.strictObject({ caution: force, stop: force }),
    }),
  }),
});

export type ParsedSettings =
  { ok: true; settings: CompanySettings } | { ok: false; problems: Problem[] };

/** Reads anything as the settings of a company: a fresh copy, or every problem with its JSON pointer. */
export function parseCompanySettings(input: unknown): ParsedSettings {
  const plain = readPlainData(input);
  const shape = settingsShape.safeParse(plain.value);
  const problems = [
    ...plain.problems,
    ...schemaProblems(shape.error?.issues ?? [], plain.value, []),
    ...inOrder(plain.value),
  ];
  if (problems.length > 0 || !shape.success) return { ok: false, problems };
  return { ok: true, settings: shape.data };
}

/** Pairs of which the second is never below the first. */
const ORDERED = [
  ['friction', 'low', 'likely'],
  ['friction', 'likely', 'high'],
  ['limits', 'handOne', 'handTwo'],
] as const;

function inOrder(value: unknown): Problem[] {
  const pull = asObject(asObject(value).pull);
  return ORDERED.flatMap(([group, least, most]) => {
    const fields = asObject(pull[group]);
    const [low, high] = [asNumber(fields[least]), asNumber(fields[most])];
    if (low === null || high === null || high >= low) return [];
    const pointer = pointerOf(['pull', group, most]);
    return [{ pointer, code: 'not-in-order', found: high, allowed: { atLeast: low } }];
  });
}
