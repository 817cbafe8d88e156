import type { Finding } from '../contracts/run-analysis';
import type { SectionSpan } from '../run/expanded-run';
import { TELECOM_LIMIT_LENGTH, TELECOM_SOURCE } from '../tables/bend-limits';
import type { CheckContext } from './check-context';

export interface LengthLimit {
  /** Developed length, in. */
  length: number;
  from: 'job' | 'telecom';
  source: string | null;
}

/** The tightest limit on the length of a section, if anybody set one. The NEC sets none. */
export function lengthLimit({ profile, overrides }: CheckContext): LengthLimit | null {
  const job: LengthLimit | null =
    typeof overrides.maxSectionLength === 'number'
      ? { length: overrides.maxSectionLength, from: 'job', source: overrides.source ?? null }
      : null;
  if (profile !== 'telecom') return job;
  return job && job.length < TELECOM_LIMIT_LENGTH
    ? job
    : { length: TELECOM_LIMIT_LENGTH, from: 'telecom', source: TELECOM_SOURCE };
}

/** A thousandth of an inch is no longer pipe. */
const TOLERANCE = 1e-3;

/**
 * The developed length of a section against the specification's or the telecom limit; never called code.
 * Example: 220 ft under a specification of 150 ft is a stop, 840 in over; the same run under power rules alone passes.
 */
export function checkSectionLength(context: CheckContext, span: SectionSpan): Finding[] {
  const limit = lengthLimit(context);
  const length = span.toStation - span.fromStation;
  if (!limit || context.expanded.length === null || length <= limit.length + TOLERANCE) return [];
  const over = length - limit.length;
  const values = { length, limit: limit.length, over, limitFrom: limit.from, source: limit.source };
  return [
    { code: 'length-over', severity: 'stop', at: { sectionId: span.id }, values, rule: null },
  ];
}
