import { Inject, Injectable } from '@nestjs/common';
import { CLOCK, type Clock } from '../config/config.module.js';
import { cautionFor, type CatalogueProduct } from '../products/catalogue.js';
import { CatalogueService } from '../products/catalogue.service.js';
import type { CurrentPlanDto } from '../products/dto/current-plan.dto.js';
import { toProductDto } from '../products/dto/product.dto.js';
import { GoldenChecksService } from './golden-checks.service.js';

/** Tells a station by what to test and to judge, and whether it owes a golden check. */
@Injectable()
export class CurrentPlansService {
  constructor(
    private readonly catalogue: CatalogueService,
    private readonly goldenChecks: GoldenChecksService,
    @Inject(CLOCK) private readonly now: Clock,
  ) {}

  /** @throws NotFoundError when there is no such stage. */
  current(partNumber: string, stageName: string, stationId: number | undefined): CurrentPlanDto {
    const { product, stage } = this.catalogue.stageNamed(partNumber, stageName);
    const { testPlan, limitSet } = toProductDto(product, this.now()).stages.find(
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
      testPlan,
      limitSet,
      goldenSerialNumbers: [...product.goldenCheckHours.keys()],
      goldenCheckDueAt: this.goldenCheckDueAt(product, stationId),
    };
  }

  /** A station that never measured one owes it since ever, which is told as the time of asking. */
  private goldenCheckDueAt(product: CatalogueProduct, stationId: number | undefined): string | null {
    if (stationId === undefined || product.goldenCheckHours.size === 0) return null;
    return new Date(this.goldenChecks.dueAt(stationId, product) ?? this.now()).toISOString();
  }
}
