import { LIMITS } from '@fairlead/shared';
import type { Say } from '../../../hooks/use-words';
import { byteLength } from '../../../lib/field-problems';
import { textRule } from '../../../lib/text-rule';

const EMAIL = /^[^\s@]+@[^\s@]+\.[^\s@.]+$/;

type Rule = (value: string) => string | null;

/** What the form can say before it asks the server; the server checks again. */
export function authRules(
  say: Say,
): Record<'email' | 'password' | 'newPassword' | 'name' | 'companyName', Rule> {
  return {
    name: textRule(say, LIMITS.personName, true),
    companyName: textRule(say, LIMITS.companyName, true),
    email: (value) => {
      const wrong = textRule(say, LIMITS.email, true)(value);
      return wrong ?? (EMAIL.test(value.trim()) ? null : say('auth.problem.email'));
    },
    password: (value) => (value === '' ? say('app.problem.required') : null),
    newPassword: (value) => {
      if (value === '') return say('app.problem.required');
      if ([...value].length < LIMITS.passwordMin) {
        return say('auth.problem.passwordShort', { min: LIMITS.passwordMin });
      }
      return byteLength(value) > LIMITS.passwordBytes
        ? say('auth.problem.passwordLong', { max: LIMITS.passwordBytes })
        : null;
    },
  };
}
