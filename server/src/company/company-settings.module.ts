import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { Company } from '../people/models/company.model';
import { CompanySettingsService } from './company-settings.service';

/** Apart from the rest, so that runs can read the settings they are judged by. */
@Module({
  imports: [SequelizeModule.forFeature([Company])],
  providers: [CompanySettingsService],
  exports: [CompanySettingsService, SequelizeModule],
})
export class CompanySettingsModule {}
