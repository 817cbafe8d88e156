import type { ApiError, Problem } from '@fairlead/shared';

/** The problems of an answer by the name of the field they point at: `/email` is `email`. */
export function problemsByField(error: ApiError): Map<string, Problem> {
  return new Map(
    (error.problems ?? []).map((problem) => [problem.pointer.split('/')[1] ?? '', problem]),
  );
}

/** Bytes in UTF-8: what the password hash reads. */
export function byteLength(text: string): number {
  return new TextEncoder().encode(text).length;
}
