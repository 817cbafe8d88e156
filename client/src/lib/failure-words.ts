import type { Say } from '../hooks/use-words';
import type { RequestFailure } from './request-error';

/** What a person is told when the server refused something or was not there; a failure of ours carries its reference. */
export function failureWords(failure: RequestFailure, say: Say): string {
  if (failure.kind === 'network') return say('app.error.network');
  const { code, requestId, retryAfter } = failure.error;
  const words = say(`app.error.code.${code}`, { seconds: retryAfter ?? 60 });
  return code === 'server-error'
    ? `${words} ${say('app.error.reference', { reference: requestId })}`
    : words;
}
