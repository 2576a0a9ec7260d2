import { Controller, Get, Query, Req } from '@nestjs/common';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import type { AmpkeepRequest } from '../auth/principals.js';
import { ApiProblems } from '../common/api-problems.decorator.js';
import { CurrentPlanDto, CurrentPlanQueryDto } from '../products/dto/current-plan.dto.js';
import { CurrentPlansService } from './current-plans.service.js';

@ApiTags('for stations')
@Controller('test-plans')
export class TestPlansController {
  constructor(private readonly plans: CurrentPlansService) {}

  @Get('current')
  @ApiOperation({ summary: 'Load steps and limits in force now, and when a golden check is due' })
  @ApiProblems(404, 422)
  current(
    @Query() { partNumber, stage }: CurrentPlanQueryDto,
    @Req() request: AmpkeepRequest,
  ): CurrentPlanDto {
    return this.plans.current(partNumber, stage, request.stationPrincipal?.stationId);
  }
}
