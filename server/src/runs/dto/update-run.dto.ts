import { LIMITS } from '@fairlead/shared';
import type { UpdateRunBody } from '@fairlead/shared';
import { TextField } from '../../common/decorators/fields';

export class UpdateRunDto implements UpdateRunBody {
  @TextField({ min: 0, max: LIMITS.area, optional: true })
  declare area?: string;

  @TextField({ min: 0, max: LIMITS.system, optional: true })
  declare system?: string;
}
