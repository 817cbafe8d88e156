import { Module } from '@nestjs/common';
import { RunsModule } from '../runs/runs.module';
import { CompanyController } from './company.controller';
import { CompanyService } from './company.service';
import { CompanySettingsModule } from './company-settings.module';

@Module({
  imports: [CompanySettingsModule, RunsModule],
  controllers: [CompanyController],
  providers: [CompanyService],
})
export class CompanyModule {}
