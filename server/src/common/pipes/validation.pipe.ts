import { ValidationPipe } from '@nestjs/common';
import type { ValidationError } from 'class-validator';
import type { Problem } from '@fairlead/shared';
import { invalid } from '../api-exception';
import type { ApiException } from '../api-exception';

/** Longest piece of what was sent that an answer repeats. */
const FOUND_LENGTH = 200;

export function createValidationPipe(): ValidationPipe {
  return new ValidationPipe({
    whitelist: true,
    forbidNonWhitelisted: true,
    transform: true,
    transformOptions: { enableImplicitConversion: false },
    exceptionFactory: refusal,
  });
}

function refusal(errors: ValidationError[]): ApiException {
  const problems = errors.flatMap((error) => problemsOf(error, ''));
  const noBase = problems.some(
    ({ pointer, code }) => pointer === '/baseVersion' && code === 'required',
  );
  return invalid(noBase ? 'base-version-missing' : 'validation-failed', problems);
}

function problemsOf(error: ValidationError, parent: string): Problem[] {
  const pointer = `${parent}/${error.property.replaceAll('~', '~0').replaceAll('/', '~1')}`;
  const own = Object.keys(error.constraints ?? {}).map((name) => {
    const context = error.contexts?.[name] as { allowed: unknown; secret?: boolean } | undefined;
    return {
      pointer,
      code: codeOf(name, error.value),
      found: context?.secret ? null : preview(error.value),
      allowed: context?.allowed ?? null,
    };
  });
  return [...own, ...(error.children ?? []).flatMap((child) => problemsOf(child, pointer))];
}

function codeOf(constraint: string, value: unknown): string {
  if (constraint === 'whitelistValidation') return 'unknown-field';
  if (value === undefined) return 'required';
  return constraint;
}

function preview(value: unknown): unknown {
  if (value === undefined) return null;
  if (typeof value === 'string') return value.slice(0, FOUND_LENGTH);
  if (typeof value === 'object' && value !== null) return Array.isArray(value) ? 'array' : 'object';
  return value;
}
