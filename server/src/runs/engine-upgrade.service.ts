import { Inject, Injectable, Logger } from '@nestjs/common';
import { Interval } from '@nestjs/schedule';
import { InjectModel } from '@nestjs/sequelize';
import { Op } from 'sequelize';
import { ENGINE_VERSION, parseRunDocument } from '@fairlead/shared';
import type { CompanySettings, RevisionState } from '@fairlead/shared';
import { CompanySettingsService } from '../company/company-settings.service';
import { APP_CONFIG } from '../config/config.module';
import type { AppConfig } from '../config/environment';
import { withNamedLock } from '../database/named-lock';
import { analyzeDocument } from './analyze-document';
import { isOlderVersion } from './engine-order';
import { RunRevision } from './models/run-revision.model';
import { summaryColumns } from './revision-columns';

const BATCH = 100;
const FIVE_MINUTES = 5 * 60 * 1000;
/** Older than every engine: what the settings of its company no longer are. */
const OUTDATED = '0';
/** What was released stands as it was released, figures included. */
const RECOMPUTED: RevisionState[] = ['draft', 'checked'];

/**
 * Brings summary columns that an older engine made, or other settings of the company, up to date; only one process at a time
 * does.
 */
@Injectable()
export class EngineUpgradeService {
  private readonly logger = new Logger(EngineUpgradeService.name);

  constructor(
    @InjectModel(RunRevision) private readonly revisions: typeof RunRevision,
    private readonly settings: CompanySettingsService,
    @Inject(APP_CONFIG) private readonly config: AppConfig,
  ) {}

  /** Marks every revision of a company that is still worked on; the next pass judges it anew. */
  async outdate(companyId: string): Promise<void> {
    await this.revisions.update(
      { engineVersion: OUTDATED },
      { where: { companyId, state: RECOMPUTED } },
    );
  }

  /** Starts a pass and does not wait for it. What another process leaves behind the next one finds. */
  @Interval(FIVE_MINUTES)
  runSoon(): void {
    this.run().catch((thrown: unknown) => {
      this.logger.warn(`upgrade failed: ${thrown instanceof Error ? thrown.name : 'unknown'}`);
    });
  }

  /** Returns how many revisions were recomputed; 0 also while another process is at it. */
  async run(): Promise<number> {
    const { database } = this.config;
    return (await withNamedLock(database, 'fairlead-engine', 0, () => this.recompute())) ?? 0;
  }

  private async recompute(): Promise<number> {
    let count = 0;
    const known = new Map<string, CompanySettings>();
    for (const engineVersion of await this.olderVersions()) {
      let after = '';
      for (;;) {
        const batch = await this.revisions.findAll({
          where: { engineVersion, state: RECOMPUTED, id: { [Op.gt]: after } },
          order: [['id', 'ASC']],
          limit: BATCH,
        });
        for (const revision of batch) {
          const { companyId } = revision;
          const settings = known.get(companyId) ?? (await this.settings.of(companyId));
          known.set(companyId, settings);
          count += await this.recomputeOne(revision, settings);
        }
        const last = batch.at(-1);
        if (!last) break;
        after = last.id;
      }
    }
    return count;
  }

  private async olderVersions(): Promise<string[]> {
    const rows = await this.revisions.findAll({
      attributes: ['engineVersion'],
      where: { state: RECOMPUTED },
      group: ['engineVersion'],
    });
    return rows
      .map(({ engineVersion }) => engineVersion)
      .filter((version) => isOlderVersion(version, ENGINE_VERSION));
  }

  /** A save that comes between carries newer columns and another version, and wins. */
  private async recomputeOne(
    { companyId, id, version, document }: RunRevision,
    settings: CompanySettings,
  ): Promise<number> {
    const parsed = parseRunDocument(document);
    if (!parsed.ok) {
      this.logger.warn(
        `revision ${id} is no longer read by the parser; its columns stay as they are`,
      );
      return 0;
    }
    const columns = summaryColumns(analyzeDocument(parsed.document, settings));
    const [count] = await this.revisions.update(columns, { where: { companyId, id, version } });
    return count;
  }
}
