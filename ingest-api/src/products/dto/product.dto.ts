import { riskOfGuardFactor } from '../../analysis/risk/guard-factor.js';
import type { CircuitKind, MeasureName } from '../../analysis/analysis.types.js';
import { cautionFor, type CatalogueProduct, type CatalogueStage, inForceAt } from '../catalogue.js';

export class TestPlanDto {
  version!: number;
  loadVolts!: number[];
  referenceVolts!: number;
  dwellMs!: number;
  repeatFirst!: boolean;
  upAndDown!: boolean;
}

export class MeasureLimitDto {
  measure!: MeasureName;
  lower!: number | null;
  upper!: number | null;
  rule!: 'guarded' | 'simple';
  guardFactor!: number;
  /** Largest risk, 0 to 1, that the guard band leaves of passing a unit that lies just outside a limit. */
  guardedRisk!: number;
}

export class LimitSetDto {
  version!: number;
  releasedAt!: string;
  effectiveAt!: string;
  releasedBy!: string;
  limits!: MeasureLimitDto[];
}

export class ProductStageDto {
  stage!: string;
  /** 1 comes first. */
  position!: number;
  maxAttempts!: number;
  yieldTarget!: number | null;
  /** In force now. */
  testPlan!: TestPlanDto | null;
  /** In force now. */
  limitSet!: LimitSetDto | null;
}

export class ProductDto {
  /** @example "FH-R500-W" */
  partNumber!: string;
  description!: string;
  nominalAmps!: number;
  supplyVolts!: number;
  complianceLowVolts!: number;
  complianceHighVolts!: number;
  /** τ as a fraction. */
  complianceTolerance!: number;
  direction!: 'source' | 'sink';
  circuitKind!: CircuitKind;
  caution!: string | null;
  stages!: ProductStageDto[];
}

export function toProductDto(product: CatalogueProduct, now: number): ProductDto {
  const { partNumber, description, direction, spec, stages } = product;
  const {
    nominalAmps,
    supplyVolts,
    complianceLowVolts,
    complianceHighVolts,
    complianceTolerance,
    circuitKind,
  } = spec;
  return {
    partNumber,
    description,
    nominalAmps,
    supplyVolts,
    complianceLowVolts,
    complianceHighVolts,
    complianceTolerance,
    direction,
    circuitKind,
    caution: cautionFor(spec),
    stages: stages.map((stage) => toStageDto(stage, now)),
  };
}

function toStageDto(stage: CatalogueStage, now: number): ProductStageDto {
  const plan = inForceAt(stage.plans, now);
  const set = inForceAt(stage.limitSets, now);
  return {
    stage: stage.name,
    position: stage.position,
    maxAttempts: stage.maxAttempts,
    yieldTarget: stage.yieldTarget,
    testPlan: plan && {
      version: plan.version,
      loadVolts: plan.loadVolts,
      referenceVolts: plan.referenceVolts,
      dwellMs: plan.dwellMs,
      repeatFirst: plan.repeatFirst,
      upAndDown: plan.upAndDown,
    },
    limitSet: set && {
      version: set.version,
      releasedAt: new Date(set.releasedAt).toISOString(),
      effectiveAt: new Date(set.effectiveAt).toISOString(),
      releasedBy: set.releasedBy,
      limits: set.limits.map(({ measure, lower, upper, rule, guardFactor }) => ({
        measure,
        lower,
        upper,
        rule,
        guardFactor,
        guardedRisk: riskOfGuardFactor(guardFactor),
      })),
    },
  };
}
