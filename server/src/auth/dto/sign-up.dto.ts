import { LIMITS } from '@fairlead/shared';
import type { SignUpBody } from '@fairlead/shared';
import { EmailField, NewPasswordField, TextField } from '../../common/decorators/fields';

export class SignUpDto implements SignUpBody {
  @TextField({ max: LIMITS.personName })
  declare name: string;

  @EmailField({ max: LIMITS.email })
  declare email: string;

  @NewPasswordField({ characters: LIMITS.passwordMin, bytes: LIMITS.passwordBytes })
  declare password: string;

  @TextField({ max: LIMITS.companyName })
  declare companyName: string;

  @TextField({ max: 64, optional: true })
  declare timeZone?: string;
}
