import type { Finding } from '../../contracts/run-analysis';
import type { Candidate, FixContext } from './candidate';
import { largerRaceway } from './larger-raceway';

export function fixClearance(context: FixContext, finding: Finding): Candidate[] {
  return largerRaceway(context, finding, true);
}
