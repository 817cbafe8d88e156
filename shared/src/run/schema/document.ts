import * as z from 'zod/mini';
import { LIMITS } from '../../contracts/limits';
import { BOUNDS } from '../document-bounds';
import { CODE_EDITIONS, RUN_FORMAT, RUN_VERSION } from '../run-document';
import { pathElement } from './elements';
import {
  between,
  dimension,
  direction,
  id,
  length,
  name,
  orNull,
  positive,
  raceway,
  text,
  whole,
  zeroOrMore,
} from './primitives';

const temperature = between(BOUNDS.temperatureLow, BOUNDS.temperatureHigh);
const friction = zeroOrMore(BOUNDS.friction);
const force = orNull(positive(BOUNDS.force));
const feedTension = zeroOrMore(BOUNDS.force);

const rules = z.strictObject({
  code: z.optional(z.enum(CODE_EDITIONS)),
  profile: z.optional(z.enum(['power', 'telecom'])),
  overrides: z.optional(
    z.strictObject({
      maxDegrees: orNull(positive(BOUNDS.maxDegrees)),
      maxSectionLength: orNull(length),
      maxFillPercent: orNull(positive(BOUNDS.percent)),
      minBendRadius: orNull(dimension),
      source: z.optional(text(LIMITS.source)),
    }),
  ),
});

const environment = z.strictObject({
  ambient: orNull(temperature),
  rooftopHeight: orNull(zeroOrMore(BOUNDS.dimension)),
  wet: z.optional(z.boolean()),
  buried: z.optional(z.boolean()),
  temperatureChange: orNull(between(-BOUNDS.temperatureHigh, BOUNDS.temperatureHigh)),
});

const circuit = z.strictObject({
  overcurrent: orNull(positive(BOUNDS.current)),
  terminations: z.optional(z.literal([60, 75, 90])),
  wyeFourWire: z.optional(z.boolean()),
  nonlinear: z.optional(z.boolean()),
});

const pull = z.strictObject({
  id,
  from: id,
  to: id,
  feedAt: z.optional(z.enum(['from', 'to'])),
});

const conditions = z.strictObject({
  friction: z.optional(z.strictObject({ low: friction, likely: friction, high: friction })),
  ropeFriction: z.optional(friction),
  crew: z.optional(
    z.strictObject({ feeding: whole(0, BOUNDS.people), pulling: whole(0, BOUNDS.people) }),
  ),
  feedTension: z.optional(
    z.union([feedTension, z.strictObject({ from: feedTension, to: feedTension })]),
  ),
  attachment: z.optional(z.enum(['eye', 'basket-grip', 'tied-head'])),
  lubricated: z.optional(z.boolean()),
  ambientTemperature: orNull(temperature),
  limits: z.optional(
    z.strictObject({
      handOne: force,
      handTwo: force,
      puller: force,
      rope: force,
      sidewall: z.optional(z.strictObject({ caution: force, stop: force })),
    }),
  ),
});

/** The whole document but its conductor groups, which `groupSchema` reads one by one. */
export const runDocumentShape = z.strictObject({
  format: z.literal(RUN_FORMAT),
  version: z.literal(RUN_VERSION),
  tag: name(LIMITS.tag),
  title: z.optional(text(LIMITS.title)),
  rules: z.optional(rules),
  raceway,
  environment: z.optional(environment),
  start: z.optional(z.strictObject({ heading: z.optional(direction) })),
  path: z.array(pathElement).check(z.minLength(2), z.maxLength(LIMITS.elements)),
  conductors: z.optional(z.array(z.unknown()).check(z.maxLength(LIMITS.conductorGroups))),
  sets: z.optional(whole(1, BOUNDS.sets)),
  circuit: z.optional(circuit),
  parallel: orNull(
    z.strictObject({
      group: name(LIMITS.tag),
      set: whole(1, BOUNDS.sets),
      of: whole(1, BOUNDS.sets),
    }),
  ),
  rack: orNull(z.strictObject({ count: whole(1, BOUNDS.sets), spacing: dimension })),
  pulls: z.optional(z.array(pull).check(z.maxLength(LIMITS.elements))),
  conditions: z.optional(conditions),
});
