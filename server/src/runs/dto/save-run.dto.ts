import type { RunDocument, SaveRunBody } from '@fairlead/shared';
import { BaseVersionField, DocumentField } from '../../common/decorators/fields';

export class SaveRunDto implements SaveRunBody {
  @BaseVersionField()
  declare baseVersion: number;

  @DocumentField()
  declare document: RunDocument;
}
