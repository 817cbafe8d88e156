import * as z from 'zod/mini';
import { LIMITS } from '../../contracts/limits';
import { BOUNDS } from '../document-bounds';
import { COMPASS, RACEWAY_TYPES, TRADE_SIZES } from '../run-document';

/** Control, half and line-breaking characters, and those that turn the reading direction round. */
const UNCLEAN = /[\p{Cc}\p{Cs}\p{Zl}\p{Zp}\u202a-\u202e\u2066-\u2069]/u;
const ID = /^[A-Za-z0-9][A-Za-z0-9._:-]*$/;

const clean = z.refine<string>((text) => !UNCLEAN.test(text), {
  params: { code: 'unclean-text', allowed: 'no control characters' },
});
const trimmed = z.refine<string>((text) => text.trim() === text, {
  params: { code: 'untrimmed-text', allowed: 'no space at either end' },
});

/** One line of text a person typed; may be empty. */
export const text = (longest: number) => z.string().check(z.maxLength(longest), clean);

/** Text that names something: at least one character, no space round it. */
export const name = (longest: number) =>
  z.string().check(z.minLength(1), z.maxLength(longest), clean, trimmed);

/** Ids serve as keys of maps, so the names every object already answers to are no ids. */
export const id = z.string().check(
  z.maxLength(LIMITS.elementId),
  z.refine((value) => ID.test(value) && !(value in {}), {
    params: { code: 'id-not-allowed', allowed: 'letters, digits, . _ : -' },
  }),
);

/** Above zero, up to and with `most`. */
export const positive = (most: number) => z.number().check(z.gt(0), z.lte(most));
/** Zero or more, up to and with `most`. */
export const zeroOrMore = (most: number) => z.number().check(z.gte(0), z.lte(most));
export const between = (least: number, most: number) => z.number().check(z.gte(least), z.lte(most));
export const whole = (least: number, most: number) => z.int().check(z.gte(least), z.lte(most));

export const length = positive(BOUNDS.length);
export const dimension = positive(BOUNDS.dimension);
export const orNull = <T extends z.ZodMiniType>(schema: T) => z.optional(z.nullable(schema));

export const direction = z.union([
  z.enum(COMPASS),
  z.strictObject({ azimuth: between(0, 360), elevation: between(-90, 90) }),
]);

export const raceway = z.strictObject({
  type: z.enum(RACEWAY_TYPES),
  tradeSize: z.enum(TRADE_SIZES),
  bendRadius: orNull(dimension),
});
