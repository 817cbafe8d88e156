import type { Finding } from '../../contracts/run-analysis';
import type { Candidate, FixContext } from './candidate';
import { largerRaceway } from './larger-raceway';

/** Another type of the same size has nearly the same bore: only sizes are offered. */
export function fixJam(context: FixContext, finding: Finding): Candidate[] {
  return largerRaceway(context, finding, false);
}
