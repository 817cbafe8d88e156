import { Injectable } from '@nestjs/common';
import { DEFAULT_SETTINGS } from '@fairlead/shared';
import type { AnalysisAnswer, AnalyzeBody } from '@fairlead/shared';
import { RATE_LIMITS, RateLimitsService } from '../rate-limits/rate-limits.service';
import { readDocument } from '../runs/analyze-document';

@Injectable()
export class AnalysesService {
  constructor(private readonly rateLimits: RateLimitsService) {}

  /** Nobody is signed in, so no company's settings apply, and nothing is kept. */
  async analyze({ document }: AnalyzeBody, address: string): Promise<AnalysisAnswer> {
    await this.rateLimits.hit(RATE_LIMITS.analyses, address);
    const { analysis } = readDocument(document, DEFAULT_SETTINGS);
    return { analysis };
  }
}
