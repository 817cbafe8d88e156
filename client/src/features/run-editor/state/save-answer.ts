import { parseRunDocument } from '@fairlead/shared';
import type { Problem, Run } from '@fairlead/shared';
import type { NeedsYouReason } from './run-editor-state';
import type { TransportFailure } from './run-transport';

/** What a failed save means for the run. */
export type FailedSave =
  /** Not known whether it arrived: the same save is sent again under the same key. */
  | { next: 'again'; afterMs: number | null }
  /** It did not arrive and the key is spent: sent again under a new one. */
  | { next: 'again-with-new-key' }
  | { next: 'conflict'; theirs: Run }
  | {
      next: 'ask';
      reason: NeedsYouReason;
      problems: Problem[];
      requestId: string | null;
      isSettled: boolean;
    };

const BROKEN_DOCUMENT = [
  'bad-request',
  'validation-failed',
  'invalid-document',
  'too-deep',
  'too-large',
];

export function readFailedSave(failure: TransportFailure): FailedSave {
  if (failure.kind === 'network') return { next: 'again', afterMs: null };
  const { status, code, current, problems = [], requestId, retryAfter } = failure.error;
  if (status >= 500 || status === 408 || status === 429) {
    return { next: 'again', afterMs: retryAfter === undefined ? null : retryAfter * 1000 };
  }
  if (code === 'idempotency-key-reused') return { next: 'again-with-new-key' };
  if (code === 'stale-version' && isRun(current)) return { next: 'conflict', theirs: current };
  const ask = (reason: NeedsYouReason, isSettled = true): FailedSave => ({
    next: 'ask',
    reason,
    problems,
    requestId: requestId || null,
    isSettled,
  });
  if (status === 401) return ask('signed-out', false);
  if (status === 403) return ask('not-allowed');
  if (status === 404) return ask('gone');
  return ask(BROKEN_DOCUMENT.includes(code) ? 'invalid' : 'refused');
}

/** `current` comes over the wire untyped; only a run whose document can be read is shown as theirs. */
function isRun(value: unknown): value is Run {
  if (typeof value !== 'object' || value === null || !('revision' in value)) return false;
  const { revision } = value;
  if (typeof revision !== 'object' || revision === null) return false;
  const { version, document } = revision as Record<string, unknown>;
  return typeof version === 'number' && parseRunDocument(document).ok;
}
