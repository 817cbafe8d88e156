import type { AnalyzeBody, RunDocument } from '@fairlead/shared';
import { DocumentField } from '../../common/decorators/fields';

export class AnalyzeDto implements AnalyzeBody {
  @DocumentField()
  declare document: RunDocument;
}
