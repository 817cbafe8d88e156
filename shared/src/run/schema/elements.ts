import * as z from 'zod/mini';
import { LIMITS } from '../../contracts/limits';
import { BOUNDS } from '../document-bounds';
import { CONDUIT_BODIES, DEVICES, FITTINGS, TRADE_SIZES, WALLS } from '../run-document';
import {
  dimension,
  direction,
  id,
  length,
  positive,
  raceway,
  text,
  whole,
  zeroOrMore,
} from './primitives';

const MOST_ENTRIES = 100;

const belowOffset = z.number().check(z.gt(0), z.lt(BOUNDS.offsetAngleBelow));
const toward = z.optional(direction);
const radius = z.optional(dimension);
const made = z.optional(z.enum(['field', 'factory']));

const pullPoint = z.strictObject({
  kind: z.literal('pull-point'),
  id,
  device: z.enum(DEVICES),
  label: z.optional(text(LIMITS.label)),
  accessible: z.optional(z.boolean()),
  body: z.optional(z.enum(CONDUIT_BODIES)),
  turn: z.optional(
    z.strictObject({ angle: positive(BOUNDS.turnAngle), toward, sheaveRadius: radius }),
  ),
  makeUp: z.optional(zeroOrMore(BOUNDS.dimension)),
  reach: z.optional(z.boolean()),
  place: z.optional(text(LIMITS.label)),
  entries: z.optional(
    z
      .array(
        z.strictObject({
          wall: z.enum(WALLS),
          row: whole(1, MOST_ENTRIES),
          tradeSize: z.enum(TRADE_SIZES),
          runId: z.optional(id),
        }),
      )
      .check(z.maxLength(MOST_ENTRIES)),
  ),
  boxSize: z.optional(z.strictObject({ width: dimension, height: dimension, depth: dimension })),
  raceway: z.optional(raceway),
});

const straight = z.strictObject({ kind: z.literal('straight'), id, length });

const bend = z.strictObject({
  kind: z.literal('bend'),
  id,
  angle: positive(BOUNDS.bendAngle),
  toward,
  radius,
  made,
  counts: z.optional(z.boolean()),
  why: z.optional(text(BOUNDS.why)),
});

const offset = z.strictObject({
  kind: z.literal('offset'),
  id,
  rise: dimension,
  angle: belowOffset,
  toward,
  radius,
  made,
});

const saddle3 = z.strictObject({
  kind: z.literal('saddle-3'),
  id,
  height: dimension,
  angle: positive(BOUNDS.saddle3Angle),
  toward,
  radius,
});

const saddle4 = z.strictObject({
  kind: z.literal('saddle-4'),
  id,
  height: dimension,
  width: dimension,
  angle: belowOffset,
  toward,
  radius,
});

const flex = z.strictObject({
  kind: z.literal('flex'),
  id,
  length,
  degrees: z.optional(zeroOrMore(BOUNDS.flexDegrees)),
  raceway,
});

const fitting = z.strictObject({
  kind: z.literal('fitting'),
  id,
  fitting: z.enum(FITTINGS),
  angle: z.optional(positive(BOUNDS.fittingAngle)),
});

const transition = z.strictObject({ kind: z.literal('transition'), id, raceway });

export const pathElement = z.discriminatedUnion('kind', [
  pullPoint,
  straight,
  bend,
  offset,
  saddle3,
  saddle4,
  flex,
  fitting,
  transition,
]);
