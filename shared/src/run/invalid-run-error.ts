import type { Problem } from '../contracts/errors';

/** Thrown where a run document that was never parsed turns out not to be one. */
export class InvalidRunError extends Error {
  constructor(readonly problems: Problem[]) {
    super(
      `The run document has ${problems.length} problem(s); the first is at "${problems[0]?.pointer}".`,
    );
    this.name = 'InvalidRunError';
  }
}
