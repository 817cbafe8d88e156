import { Module } from '@nestjs/common';
import { RateLimitsModule } from '../rate-limits/rate-limits.module';
import { AnalysesController } from './analyses.controller';
import { AnalysesService } from './analyses.service';

@Module({
  imports: [RateLimitsModule],
  controllers: [AnalysesController],
  providers: [AnalysesService],
})
export class AnalysesModule {}
