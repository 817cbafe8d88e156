import type { ApiError } from '@fairlead/shared';
import type { Say } from '../../../hooks/use-words';
import { problemsByField } from '../../../lib/field-problems';
import type { RequestFailure } from '../../../lib/request-error';

/** What a form says when the server refused it or was not there. */
export function failureWords(failure: RequestFailure, say: Say): string {
  if (failure.kind === 'network') return say('jobs.failure.network');
  const { error } = failure;
  if (error.status === 403) return say('jobs.failure.forbidden');
  if (error.status === 429) return say('jobs.failure.tooMany', { count: error.retryAfter ?? 60 });
  return `${say('jobs.failure.save')} ${say('jobs.failure.reference', { reference: error.requestId })}`;
}

/** The server's problems beside the fields of a form; `taken` words the one field that must be unique. */
export function fieldProblems(
  error: ApiError,
  fields: readonly string[],
  taken: { field: string; words: string },
  say: Say,
): Record<string, string> {
  if (error.code === 'already-exists') return { [taken.field]: taken.words };
  const problems = problemsByField(error);
  return Object.fromEntries(
    fields
      .filter((field) => problems.has(field))
      .map((field) => [field, say('jobs.problem.refused')]),
  );
}

/** Required, and no longer than the column. */
export function textRule(say: Say, max: number, required: boolean) {
  return (text: string): string | null => {
    if (required && text.trim() === '') return say('jobs.problem.required');
    return text.trim().length > max ? say('jobs.problem.long', { max }) : null;
  };
}
