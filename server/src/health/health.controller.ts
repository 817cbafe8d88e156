import { Controller, Get } from '@nestjs/common';
import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import { ApiException } from '../common/api-exception';
import { Public } from '../common/decorators/access';

@Controller('health')
export class HealthController {
  constructor(private readonly sequelize: Sequelize) {}

  /** Up, and able to reach its database. */
  @Public()
  @Get()
  async health(): Promise<{ status: 'ok' }> {
    try {
      await this.sequelize.query('SELECT 1', { type: QueryTypes.SELECT });
      return { status: 'ok' };
    } catch {
      throw new ApiException(503, 'server-error', { retryAfter: 2 });
    }
  }
}
