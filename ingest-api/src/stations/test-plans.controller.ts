import { Controller, Get, Inject, Query, Req } from '@nestjs/common';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import type { AmpkeepRequest } from '../auth/principals.js';
import { ApiProblems } from '../common/api-problems.decorator.js';
import { NotFoundError } from '../common/errors.js';
import { CLOCK, type Clock } from '../config/config.module.js';
import { cautionFor, type CatalogueProduct, findStage } from '../products/catalogue.js';
import { CatalogueService } from '../products/catalogue.service.js';
import { CurrentPlanDto, CurrentPlanQueryDto } from '../products/dto/current-plan.dto.js';
import { toProductDto } from '../products/dto/product.dto.js';
import { GoldenChecksService } from './golden-checks.service.js';

@ApiTags('for stations')
@Controller('test-plans')
export class TestPlansController {
  constructor(
    private readonly catalogue: CatalogueService,
    private readonly goldenChecks: GoldenChecksService,
    @Inject(CLOCK) private readonly now: Clock,
  ) {}

  @Get('current')
  @ApiOperation({ summary: 'Load steps and limits in force now, and when a golden check is due' })
  @ApiProblems(404, 422)
  current(
    @Query() { partNumber, stage: stageName }: CurrentPlanQueryDto,
    @Req() request: AmpkeepRequest,
  ): CurrentPlanDto {
    const product = this.catalogue.find(partNumber);
    const stage = product && findStage(product, stageName);
    if (product === undefined || stage === undefined)
      throw new NotFoundError(`The stage "${stageName}" of "${partNumber}"`);
    const inForce = toProductDto(product, this.now()).stages.find(
      (candidate) => candidate.stage === stageName,
    )!;
    const { nominalAmps, supplyVolts, complianceLowVolts, complianceHighVolts } = product.spec;
    return {
      partNumber,
      stage: stageName,
      nominalAmps,
      supplyVolts,
      complianceLowVolts,
      complianceHighVolts,
      maxAttempts: stage.maxAttempts,
      caution: cautionFor(product.spec),
      testPlan: inForce.testPlan,
      limitSet: inForce.limitSet,
      goldenSerialNumbers: [...product.goldenCheckHours.keys()],
      goldenCheckDueAt: this.goldenCheckDueAt(product, request.stationPrincipal?.stationId),
    };
  }

  /** A station that never measured one owes it since ever, which is told as the time of asking. */
  private goldenCheckDueAt(
    { productId, goldenCheckHours }: CatalogueProduct,
    stationId: number | undefined,
  ): string | null {
    if (stationId === undefined || goldenCheckHours.size === 0) return null;
    const lastAt = this.goldenChecks.lastGoldenAt(stationId, productId);
    const dueAt = lastAt === null ? this.now() : lastAt + Math.min(...goldenCheckHours.values()) * 3_600_000;
    return new Date(dueAt).toISOString();
  }
}
