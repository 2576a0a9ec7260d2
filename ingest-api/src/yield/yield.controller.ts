import { Controller, Get, Query } from '@nestjs/common';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { ApiProblems } from '../common/api-problems.decorator.js';
import { YieldQueryDto } from './dto/yield-query.dto.js';
import { YieldReportDto } from './dto/yield-report.dto.js';
import { YieldService } from './yield.service.js';

@ApiTags('line')
@Controller('yields')
export class YieldController {
  constructor(private readonly yields: YieldService) {}

  @Get()
  @ApiOperation({
    summary: 'Yields over a period: trend, splits, failing measures, retests, aborts, what changed',
  })
  @ApiProblems(422)
  report(@Query() query: YieldQueryDto): Promise<YieldReportDto> {
    return this.yields.report(query);
  }
}
