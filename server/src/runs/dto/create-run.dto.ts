import { LIMITS } from '@fairlead/shared';
import type { CreateRunBody, RunDocument } from '@fairlead/shared';
import { DocumentField, IdField, TextField } from '../../common/decorators/fields';

export class CreateRunDto implements CreateRunBody {
  @IdField()
  declare id: string;

  @DocumentField()
  declare document: RunDocument;

  @TextField({ min: 0, max: LIMITS.area, optional: true })
  declare area?: string;

  @TextField({ min: 0, max: LIMITS.system, optional: true })
  declare system?: string;
}
