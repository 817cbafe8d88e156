import { Inject, Injectable, Logger } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { Op } from 'sequelize';
import { ENGINE_VERSION, parseRunDocument } from '@fairlead/shared';
import type { RevisionState } from '@fairlead/shared';
import { APP_CONFIG } from '../config/config.module';
import type { AppConfig } from '../config/environment';
import { withNamedLock } from '../database/named-lock';
import { analyzeDocument } from './analyze-document';
import { isOlderVersion } from './engine-order';
import { RunRevision } from './models/run-revision.model';
import { summaryColumns } from './revision-columns';

const BATCH = 100;
/** What was released stands as it was released, figures included. */
const RECOMPUTED: RevisionState[] = ['draft', 'checked'];

/** Brings the summary columns that an older engine made up to this one; only one process at a time does. */
@Injectable()
export class EngineUpgradeService {
  private readonly logger = new Logger(EngineUpgradeService.name);

  constructor(
    @InjectModel(RunRevision) private readonly revisions: typeof RunRevision,
    @Inject(APP_CONFIG) private readonly config: AppConfig,
  ) {}

  /** Returns how many revisions were recomputed; 0 also while another process is at it. */
  async run(): Promise<number> {
    const { database } = this.config;
    return (await withNamedLock(database, 'fairlead-engine', 0, () => this.recompute())) ?? 0;
  }

  private async recompute(): Promise<number> {
    let count = 0;
    for (const engineVersion of await this.olderVersions()) {
      let after = '';
      for (;;) {
        const batch = await this.revisions.findAll({
          where: { engineVersion, state: RECOMPUTED, id: { [Op.gt]: after } },
          order: [['id', 'ASC']],
          limit: BATCH,
        });
        for (const revision of batch) count += await this.recomputeOne(revision);
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
  private async recomputeOne({ companyId, id, version, document }: RunRevision): Promise<number> {
    const parsed = parseRunDocument(document);
    if (!parsed.ok) {
      this.logger.warn(
        `revision ${id} is no longer read by the parser; its columns stay as they are`,
      );
      return 0;
    }
    const columns = summaryColumns(analyzeDocument(parsed.document));
    const [count] = await this.revisions.update(columns, { where: { companyId, id, version } });
    return count;
  }
}
