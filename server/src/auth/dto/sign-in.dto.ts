import { LIMITS } from '@fairlead/shared';
import type { SignInBody } from '@fairlead/shared';
import { EmailField, SecretField } from '../../common/decorators/fields';

/** Longer than any password that could be right; what is wrong is answered like any wrong password. */
const TYPED_PASSWORD = 1024;

export class SignInDto implements SignInBody {
  @EmailField({ max: LIMITS.email })
  declare email: string;

  @SecretField({ max: TYPED_PASSWORD })
  declare password: string;
}
