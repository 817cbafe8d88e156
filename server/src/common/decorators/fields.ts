import { Transform } from 'class-transformer';
import { ValidateIf, registerDecorator } from 'class-validator';
import { isId } from '../pipes/id.pipe';

interface Rule {
  /** The problem's code, kebab-case. */
  code: string;
  /** What the answer says is allowed. */
  allowed: unknown;
  holds: (value: unknown) => boolean;
  optional?: boolean;
  nullable?: boolean;
  /** Never repeat the value in an answer. */
  secret?: boolean;
}

/** One rule per field, so that a field has at most one problem and the answer can say what would be allowed. */
function field(rule: Rule): PropertyDecorator {
  return (target, propertyKey) => {
    const propertyName = String(propertyKey);
    if (rule.optional || rule.nullable) {
      ValidateIf((_object, value) => {
        if (value === undefined) return !rule.optional;
        return value !== null || !rule.nullable;
      })(target, propertyKey);
    }
    registerDecorator({
      name: rule.code,
      target: target.constructor,
      propertyName,
      options: { context: { allowed: rule.allowed, secret: rule.secret } },
      validator: { validate: rule.holds, defaultMessage: () => rule.code },
    });
  };
}

// Control characters would break lines of a log, a CSV or a label; tab and line ends included.
// eslint-disable-next-line no-control-regex
const CONTROL = /[\u0000-\u001f\u007f]/;

interface TextOptions {
  min?: number;
  max: number;
  optional?: boolean;
}

/** One line of text; spaces at its ends are dropped before the length is measured. */
export function TextField({ min = 1, max, optional = false }: TextOptions): PropertyDecorator {
  return (target, propertyKey) => {
    Transform(({ value }: { value: unknown }) =>
      typeof value === 'string' ? value.normalize('NFC').trim() : value,
    )(target, propertyKey);
    field({
      code: 'text',
      allowed: { min, max },
      optional,
      holds: (value) =>
        typeof value === 'string' &&
        value.length >= min &&
        value.length <= max &&
        !CONTROL.test(value),
    })(target, propertyKey);
  };
}

/** A string as it was typed, e.g. a password: never trimmed, never repeated in an answer. */
export function SecretField({ max }: { max: number }): PropertyDecorator {
  return field({
    code: 'text',
    allowed: { min: 1, max },
    secret: true,
    holds: (value) => typeof value === 'string' && value.length >= 1 && value.length <= max,
  });
}

/** A new password: `characters` at least and `bytes` at most, because bcrypt reads no further. */
export function NewPasswordField(limits: { characters: number; bytes: number }): PropertyDecorator {
  return field({
    code: 'password',
    allowed: limits,
    secret: true,
    holds: (value) =>
      typeof value === 'string' &&
      [...value].length >= limits.characters &&
      Buffer.byteLength(value) <= limits.bytes &&
      !value.includes('\0'),
  });
}

/** Something before and after one @, no spaces. Whether it exists only a mail can tell. */
const EMAIL = /^[^\s@]+@[^\s@]+$/;

export function EmailField({ max }: { max: number }): PropertyDecorator {
  return (target, propertyKey) => {
    Transform(({ value }: { value: unknown }) =>
      typeof value === 'string' ? value.normalize('NFC').trim().toLowerCase() : value,
    )(target, propertyKey);
    field({
      code: 'email',
      allowed: { max },
      holds: (value) =>
        typeof value === 'string' &&
        value.length <= max &&
        EMAIL.test(value) &&
        !CONTROL.test(value),
    })(target, propertyKey);
  };
}

export function IdField(): PropertyDecorator {
  return field({ code: 'id', allowed: 'a lower-case UUID', holds: isId });
}

export function ChoiceField(
  choices: readonly string[],
  { optional = false } = {},
): PropertyDecorator {
  return field({
    code: 'choice',
    allowed: choices,
    optional,
    holds: (value) => typeof value === 'string' && choices.includes(value),
  });
}

/** A calendar day that exists. */
export function DateField({ optional = false, nullable = false } = {}): PropertyDecorator {
  return field({
    code: 'date',
    allowed: 'YYYY-MM-DD',
    optional,
    nullable,
    holds: (value) => {
      if (typeof value !== 'string' || !/^[1-9]\d{3}-\d\d-\d\d$/.test(value)) return false;
      const day = new Date(`${value}T00:00:00Z`);
      return !Number.isNaN(day.getTime()) && day.toISOString().startsWith(value);
    },
  });
}

export function IntegerField({ min, max }: { min: number; max: number }): PropertyDecorator {
  return field({
    code: 'integer',
    allowed: { min, max },
    holds: (value) =>
      typeof value === 'number' && Number.isInteger(value) && value >= min && value <= max,
  });
}

/** The save counter the sender started from. */
export const BaseVersionField = () => IntegerField({ min: 1, max: 2_147_483_647 });

/** A run document, handed on untouched: its own parser reports what is wrong with it. */
export function DocumentField(): PropertyDecorator {
  return (target, propertyKey) => {
    Transform(({ obj }: { obj: Record<string, unknown> }) => obj[String(propertyKey)])(
      target,
      propertyKey,
    );
    field({
      code: 'object',
      allowed: 'a run document',
      holds: (value) => typeof value === 'object' && value !== null && !Array.isArray(value),
    })(target, propertyKey);
  };
}

/** A whole number in an address; anything else is left for the rule to refuse. */
export function QueryIntegerField({ min, max }: { min: number; max: number }): PropertyDecorator {
  return (target, propertyKey) => {
    Transform(({ value }: { value: unknown }) =>
      typeof value === 'string' && /^\d{1,9}$/.test(value) ? Number(value) : value,
    )(target, propertyKey);
    field({
      code: 'integer',
      allowed: { min, max },
      optional: true,
      holds: (value) =>
        typeof value === 'number' && Number.isInteger(value) && value >= min && value <= max,
    })(target, propertyKey);
  };
}
