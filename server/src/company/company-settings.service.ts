import { Injectable, Logger } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { DEFAULT_SETTINGS, parseCompanySettings } from '@fairlead/shared';
import type { CompanySettings } from '@fairlead/shared';
import { Company } from '../people/models/company.model';

/** What the runs of a company are judged by. */
@Injectable()
export class CompanySettingsService {
  private readonly logger = new Logger(CompanySettingsService.name);

  constructor(@InjectModel(Company) private readonly companies: typeof Company) {}

  async of(companyId: string): Promise<CompanySettings> {
    const company = await this.companies.findByPk(companyId, { attributes: ['id', 'settings'] });
    return this.read(company?.settings ?? null, companyId);
  }

  /** Settings stored by a version whose shape this one no longer reads give way to the defaults, and it is logged. */
  read(stored: unknown, companyId: string): CompanySettings {
    if (stored === null) return DEFAULT_SETTINGS;
    const parsed = parseCompanySettings(stored);
    if (parsed.ok) return parsed.settings;
    this.logger.warn(`settings of company ${companyId} are no longer read; the defaults stand in`);
    return DEFAULT_SETTINGS;
  }
}
