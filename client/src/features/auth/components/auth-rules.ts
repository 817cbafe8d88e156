import type { ApiError } from '@fairlead/shared';
import { LIMITS } from '@fairlead/shared';
import type { Say } from '../../../hooks/use-words';
import { byteLength, problemsByField } from '../../../lib/field-problems';
import type { RequestFailure } from '../../../lib/request-error';

const EMAIL = /^[^\s@]+@[^\s@]+\.[^\s@.]+$/;

type Rule = (value: string) => string | null;

/** What the form can say before it asks the server; the server checks again. */
export function authRules(say: Say): Record<'email' | 'password' | 'newPassword', Rule> & {
  line: (max: number) => Rule;
} {
  const line = (max: number) => (value: string) => {
    if (value.trim() === '') return say('auth.problem.required');
    return value.trim().length > max ? say('auth.problem.long', { max }) : null;
  };
  return {
    line,
    email: (value) => {
      const wrong = line(LIMITS.email)(value);
      return wrong ?? (EMAIL.test(value.trim()) ? null : say('auth.problem.email'));
    },
    password: (value) => (value === '' ? say('auth.problem.required') : null),
    newPassword: (value) => {
      if (value === '') return say('auth.problem.required');
      if ([...value].length < LIMITS.passwordMin) {
        return say('auth.problem.passwordShort', { min: LIMITS.passwordMin });
      }
      return byteLength(value) > LIMITS.passwordBytes
        ? say('auth.problem.passwordLong', { max: LIMITS.passwordBytes })
        : null;
    },
  };
}

/** Problems the server found, in words, under the form's own field names. */
export function serverProblems<Field extends string>(
  error: ApiError,
  fields: readonly Field[],
  say: Say,
): Partial<Record<Field, string>> {
  const byField = problemsByField(error);
  const taken = error.code === 'already-exists' ? say('auth.problem.emailTaken') : null;
  const worded: Partial<Record<Field, string>> = {};
  for (const field of fields) {
    if (taken !== null && field === 'email') worded[field] = taken;
    else if (byField.has(field)) worded[field] = say('auth.problem.refused');
  }
  return worded;
}

/** What went wrong with the whole form. */
export function failureWords(failure: RequestFailure, say: Say): string {
  if (failure.kind === 'network') return say('auth.failure.network');
  const { error } = failure;
  if (error.code === 'wrong-credentials') return say('auth.failure.wrong');
  if (error.status === 429) return say('auth.failure.tooMany', { count: error.retryAfter ?? 60 });
  return say('auth.failure.server', { reference: error.requestId });
}
