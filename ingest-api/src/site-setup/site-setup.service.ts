import { Inject, Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import { AuditService } from '../audit/audit.service.js';
import { InvalidError } from '../common/errors.js';
import { CLOCK, type Clock } from '../config/config.module.js';
import { Writer } from '../database/writer.js';
import { CatalogueService } from '../products/catalogue.service.js';
import { GoldenUnit } from '../products/models/golden-unit.model.js';
import { LimitSet } from '../products/models/limit-set.model.js';
import { Product } from '../products/models/product.model.js';
import { Stage } from '../products/models/stage.model.js';
import { TestPlan } from '../products/models/test-plan.model.js';
import { Instrument } from '../stations/models/instrument.model.js';
import { Station } from '../stations/models/station.model.js';
import { StationRegister } from '../stations/station-register.service.js';
import {
  type DescribedProduct,
  type DescribedStage,
  type DescribedStation,
  findSiteFaults,
  type SiteDescription,
} from './site-description.js';
import { findSiteWarnings } from './site-warnings.js';

/**
 * Adds what a site file describes: products with stages, test plans and a first released limit set, and
 * stations with their instruments. It only adds; what exists already is left as it is and reported.
 */
@Injectable()
export class SiteSetupService {
  constructor(
    private readonly writer: Writer,
    private readonly audit: AuditService,
    private readonly catalogue: CatalogueService,
    private readonly register: StationRegister,
    @Inject(CLOCK) private readonly now: Clock,
  ) {}

  /**
   * Applies the description as a whole or not at all and says line by line what became of it.
   * @throws InvalidError with every fault of the file.
   */
  async apply(description: unknown, actor: string): Promise<string[]> {
    const faults = findSiteFaults(description);
    if (faults.length > 0) throw new InvalidError(faults);
    const { products, stations } = description as SiteDescription;
    const report = await this.writer.run(async (transaction) => {
      const lines: string[] = [];
      for (const product of products) lines.push(await this.addProduct(transaction, product, actor));
      for (const station of stations) lines.push(await this.addStation(transaction, station, actor));
      return lines;
    });
    await Promise.all([this.catalogue.reload(), this.register.reload()]);
    return [...report, ...findSiteWarnings(description as SiteDescription)];
  }

  private async addProduct(
    transaction: Transaction,
    described: DescribedProduct,
    actor: string,
  ): Promise<string> {
    const { stages, goldenUnits = [], hasEmitterResistors = false, ...columns } = described;
    const { partNumber } = described;
    if ((await Product.count({ where: { partNumber }, transaction })) > 0)
      return `product ${partNumber}: exists, left as it is`;
    const product = await Product.create(
      { ...columns, hasEmitterResistors, createdAt: this.now() },
      { transaction },
    );
    for (const [index, stage] of stages.entries())
      await this.addStage(transaction, product.productId, index + 1, stage, actor);
    await GoldenUnit.bulkCreate(
      goldenUnits.map((unit) => ({ ...unit, productId: product.productId })),
      { transaction },
    );
    await this.audit.record(transaction, {
      actor,
      action: 'product.created',
      subject: partNumber,
      detail: `stages ${stages.map((stage) => stage.stage).join(', ')}, first limits released`,
    });
    return `product ${partNumber}: added with ${stages.length} stage(s), limit set 1 released`;
  }

  private async addStage(
    transaction: Transaction,
    productId: number,
    position: number,
    described: DescribedStage,
    actor: string,
  ): Promise<void> {
    const { stage: name, maxAttempts, yieldTarget = null, testPlan, limits } = described;
    const releasedAt = this.now();
    const effectiveAt = described.effectiveAt === undefined ? releasedAt : Date.parse(described.effectiveAt);
    const { stageId } = await Stage.create(
      { productId, name, position, maxAttempts, yieldTarget },
      { transaction },
    );
    await TestPlan.create(
      {
        stageId,
        version: 1,
        releasedAt,
        effectiveAt,
        loadVolts: testPlan.loadVolts,
        referenceVolts: testPlan.referenceVolts,
        dwellMs: testPlan.dwellMs ?? 0,
        repeatFirst: testPlan.repeatFirst ?? false,
        upAndDown: testPlan.upAndDown ?? false,
      },
      { transaction },
    );
    const complete = limits.map(
      ({ measure, lower = null, upper = null, rule = 'guarded', guardFactor = 1, adequacyRatio }) => ({
        measure,
        lower,
        upper,
        rule,
        guardFactor,
        ...(adequacyRatio === undefined ? {} : { adequacyRatio }),
      }),
    );
    await LimitSet.create(
      { stageId, version: 1, releasedAt, effectiveAt, releasedBy: actor, limits: complete },
      { transaction },
    );
  }

  private async addStation(
    transaction: Transaction,
    { station: name, line, instruments = [] }: DescribedStation,
    actor: string,
  ): Promise<string> {
    if ((await Station.count({ where: { name }, transaction })) > 0)
      return `station ${name}: exists, left as it is`;
    const { stationId } = await Station.create(
      { name, line, active: true, createdAt: this.now() },
      { transaction },
    );
    const elsewhere: string[] = [];
    for (const instrument of instruments) {
      const { kind, serialNumber } = instrument;
      if ((await Instrument.count({ where: { kind, serialNumber }, transaction })) > 0) {
        elsewhere.push(`; ${kind} ${serialNumber} exists, left where it is`);
      } else await Instrument.create({ ...instrument, stationId }, { transaction });
    }
    await this.audit.record(transaction, { actor, action: 'station.created', subject: name, detail: line });
    const added = instruments.length - elsewhere.length;
    return `station ${name}: added with ${added} instrument(s)${elsewhere.join('')}`;
  }
}
