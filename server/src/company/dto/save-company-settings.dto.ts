import type { CompanySettings, SaveCompanySettingsBody } from '@fairlead/shared';
import { BaseVersionField, DocumentField } from '../../common/decorators/fields';

export class SaveCompanySettingsDto implements SaveCompanySettingsBody {
  @BaseVersionField()
  declare baseVersion: number;

  @DocumentField()
  declare settings: CompanySettings;
}
