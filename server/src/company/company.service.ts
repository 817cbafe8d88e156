import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { parseCompanySettings } from '@fairlead/shared';
import type { Company as CompanyAnswer, SaveCompanySettingsBody } from '@fairlead/shared';
import { forbidden, invalid, staleVersion } from '../common/api-exception';
import type { Viewer } from '../common/viewer';
import { Transactions } from '../database/transactions';
import { Company } from '../people/models/company.model';
import { EngineUpgradeService } from '../runs/engine-upgrade.service';
import { CompanySettingsService } from './company-settings.service';
import { canUpdateSettings } from './company.policy';
import { presentCompany } from './company.presenter';

@Injectable()
export class CompanyService {
  constructor(
    @InjectModel(Company) private readonly companies: typeof Company,
    private readonly settings: CompanySettingsService,
    private readonly upgrades: EngineUpgradeService,
    private readonly transactions: Transactions,
  ) {}

  async get(viewer: Viewer): Promise<CompanyAnswer> {
    const company = await this.companies.findByPk(viewer.companyId, { rejectOnEmpty: true });
    return presentCompany(company, this.settings.read(company.settings, company.id), viewer);
  }

  /** Every draft of the company is judged anew: its lists show the new figures once the upgrade has passed. */
  async saveSettings(viewer: Viewer, body: SaveCompanySettingsBody): Promise<CompanyAnswer> {
    if (!canUpdateSettings(viewer)) throw forbidden();
    const parsed = parseCompanySettings(body.settings);
    if (!parsed.ok) {
      const below = ({ pointer, ...rest }: (typeof parsed.problems)[number]) => ({
        ...rest,
        pointer: `/settings${pointer}`,
      });
      throw invalid('validation-failed', parsed.problems.map(below));
    }
    const { companyId } = viewer;
    const saved = await this.transactions.run(async () => {
      const [count] = await this.companies.update(
        { settings: parsed.settings, settingsVersion: body.baseVersion + 1 },
        { where: { id: companyId, settingsVersion: body.baseVersion } },
      );
      if (count > 0) await this.upgrades.outdate(companyId);
      return count > 0;
    });
    const now = await this.get(viewer);
    if (!saved) throw staleVersion(now);
    this.upgrades.runSoon();
    return now;
  }
}
