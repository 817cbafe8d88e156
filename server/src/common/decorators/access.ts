import { SetMetadata } from '@nestjs/common';
import type { Right } from '../access/rights';

export const ACCESS = 'fairlead:access';

/** Every handler carries one of these; the server does not start with one that has none. */
export type AccessDecision =
  { kind: 'public' } | { kind: 'signed-in' } | { kind: 'can'; right: Right };

const decide = (decision: AccessDecision) => SetMetadata(ACCESS, decision);

/** Anyone, signed in or not. */
export const Public = () => decide({ kind: 'public' });
/** Any signed-in person. */
export const SignedIn = () => decide({ kind: 'signed-in' });
/** A signed-in person whose role holds the right. */
export const Can = (right: Right) => decide({ kind: 'can', right });
