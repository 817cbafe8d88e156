import { Body, Controller, Get, Put } from '@nestjs/common';
import type { Company } from '@fairlead/shared';
import { Can } from '../common/decorators/access';
import { CurrentViewer } from '../common/decorators/viewer';
import type { Viewer } from '../common/viewer';
import { CompanyService } from './company.service';
import { SaveCompanySettingsDto } from './dto/save-company-settings.dto';

@Controller('company')
export class CompanyController {
  constructor(private readonly company: CompanyService) {}

  @Can('company.read')
  @Get()
  get(@CurrentViewer() viewer: Viewer): Promise<Company> {
    return this.company.get(viewer);
  }

  @Can('company.settings')
  @Put('settings')
  saveSettings(
    @CurrentViewer() viewer: Viewer,
    @Body() body: SaveCompanySettingsDto,
  ): Promise<Company> {
    return this.company.saveSettings(viewer, body);
  }
}
