import { Body, Controller, HttpCode, Post, Req } from '@nestjs/common';
import type { Request } from 'express';
import type { AnalysisAnswer } from '@fairlead/shared';
import { addressOf } from '../common/address-of';
import { Public } from '../common/decorators/access';
import { AnalysesService } from './analyses.service';
import { AnalyzeDto } from './dto/analyze.dto';

@Controller()
export class AnalysesController {
  constructor(private readonly analyses: AnalysesService) {}

  @Public()
  @Post('analyses')
  @HttpCode(200)
  analyze(@Body() body: AnalyzeDto, @Req() request: Request): Promise<AnalysisAnswer> {
    return this.analyses.analyze(body, addressOf(request));
  }
}
