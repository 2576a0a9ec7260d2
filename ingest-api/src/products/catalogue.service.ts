import { Injectable, type OnModuleInit } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { Sequelize } from 'sequelize-typescript';
import { NotFoundError } from '../common/errors.js';
import { type CatalogueProduct, type CatalogueStage, findStage } from './catalogue.js';
import { GoldenUnit } from './models/golden-unit.model.js';
import { LimitSet } from './models/limit-set.model.js';
import { Product } from './models/product.model.js';
import { Stage } from './models/stage.model.js';
import { TestPlan } from './models/test-plan.model.js';

/** Products with their stages, plans and limits, held in memory: every post needs them, they seldom change. */
@Injectable()
export class CatalogueService implements OnModuleInit {
  private byPartNumber = new Map<string, CatalogueProduct>();
  private byStageId = new Map<number, { product: CatalogueProduct; stage: CatalogueStage }>();

  // Asked for so that the models are bound to their database before the first read.
  constructor(@InjectConnection() _sequelize: Sequelize) {}

  onModuleInit(): Promise<void> {
    return this.reload();
  }

  /** Reads everything anew; called after each change. */
  async reload(): Promise<void> {
    const [products, stages, plans, limitSets, goldenUnits] = await Promise.all([
      Product.findAll({ order: [['partNumber', 'ASC']] }),
      Stage.findAll({ order: [['position', 'ASC']] }),
      TestPlan.findAll({ order: [['version', 'ASC']] }),
      LimitSet.findAll({ order: [['version', 'ASC']] }),
      GoldenUnit.findAll(),
    ]);
    const stagesWithVersions = stages.map((stage) => ({
      productId: stage.productId,
      stage: toStage(stage, plans, limitSets),
    }));
    const built = products.map((product) =>
      toProduct(
        product,
        stagesWithVersions
          .filter((entry) => entry.productId === product.productId)
          .map((entry) => entry.stage),
        goldenUnits,
      ),
    );
    this.byPartNumber = new Map(built.map((product) => [product.partNumber, product]));
    this.byStageId = new Map(
      built.flatMap((product) => product.stages.map((stage) => [stage.stageId, { product, stage }])),
    );
  }

  all(): CatalogueProduct[] {
    return [...this.byPartNumber.values()];
  }

  find(partNumber: string): CatalogueProduct | undefined {
    return this.byPartNumber.get(partNumber);
  }

  /** @throws NotFoundError when there is no such product, or it has no such stage. */
  stageNamed(partNumber: string, stageName: string): { product: CatalogueProduct; stage: CatalogueStage } {
    const product = this.find(partNumber);
    const stage = product && findStage(product, stageName);
    if (product === undefined || stage === undefined)
      throw new NotFoundError(`The stage "${stageName}" of "${partNumber}"`);
    return { product, stage };
  }

  byStage(stageId: number): { product: CatalogueProduct; stage: CatalogueStage } {
    const found = this.byStageId.get(stageId);
    if (found === undefined) throw new Error(`Stage ${stageId} is not in the catalogue`);
    return found;
  }
}

function toStage(stage: Stage, plans: readonly TestPlan[], limitSets: readonly LimitSet[]): CatalogueStage {
  const { stageId, name, position, maxAttempts, yieldTarget } = stage;
  return {
    stageId,
    name,
    position,
    maxAttempts,
    yieldTarget,
    plans: plans
      .filter((plan) => plan.stageId === stageId)
      .map(
        ({
          version,
          releasedAt,
          effectiveAt,
          referenceVolts,
          loadVolts,
          dwellMs,
          repeatFirst,
          upAndDown,
        }) => ({
          version,
          releasedAt,
          effectiveAt,
          referenceVolts,
          loadVolts,
          dwellMs,
          repeatFirst,
          upAndDown,
        }),
      ),
    limitSets: limitSets
      .filter((set) => set.stageId === stageId)
      .map(({ version, releasedAt, effectiveAt, limits, releasedBy }) => ({
        version,
        releasedAt,
        effectiveAt,
        limits,
        releasedBy,
      })),
  };
}

function toProduct(
  product: Product,
  stages: CatalogueStage[],
  goldenUnits: readonly GoldenUnit[],
): CatalogueProduct {
  const { productId, partNumber, description, direction } = product;
  return {
    productId,
    partNumber,
    description,
    direction,
    stages,
    spec: {
      nominalAmps: product.nominalAmps,
      supplyVolts: product.supplyVolts,
      complianceLowVolts: product.complianceLowVolts,
      complianceHighVolts: product.complianceHighVolts,
      complianceTolerance: product.complianceTolerance,
      circuitKind: product.circuitKind,
      hasEmitterResistors: product.hasEmitterResistors,
    },
    goldenCheckHours: new Map(
      goldenUnits
        .filter((unit) => unit.productId === productId)
        .map((unit) => [unit.serialNumber, unit.checkHours]),
    ),
  };
}
