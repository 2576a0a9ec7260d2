import { Inject, Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { Sequelize } from 'sequelize-typescript';
import { type Page, readCursor, toPage } from '../common/cursor.js';
import { NotFoundError } from '../common/errors.js';
import { ENV } from '../config/config.module.js';
import type { Env } from '../config/env.js';
import { cautionFor, type CatalogueStage } from '../products/catalogue.js';
import { CatalogueService } from '../products/catalogue.service.js';
import type { RunItemDto } from '../results/dto/run-item.dto.js';
import { Lot } from '../results/models/lot.model.js';
import { Unit } from '../results/models/unit.model.js';
import { ResultReadsService } from '../results/result-reads.service.js';
import { sitePeriod } from '../yield/time-buckets.js';
import { UnitQueryDto } from './dto/unit-query.dto.js';
import type { UnitDto, UnitItemDto, UnitStageDto } from './dto/unit.dto.js';
import { findUnits, findUnitStages, type UnitRow, type UnitStageRow } from './units.queries.js';

/** A unit is tested a handful of times; a golden unit thousands: the page shows its newest. */
const shownResults = 200;

@Injectable()
export class UnitsService {
  constructor(
    @InjectConnection() private readonly sequelize: Sequelize,
    private readonly catalogue: CatalogueService,
    private readonly results: ResultReadsService,
    @Inject(ENV) private readonly env: Env,
  ) {}

  async list({ cursor, limit = 50, from, to, ...filter }: UnitQueryDto): Promise<Page<UnitItemDto>> {
    const period = sitePeriod(from, to, this.env.timeZone);
    const rows = await findUnits(
      this.sequelize,
      { ...filter, ...period, before: readCursor(cursor) },
      limit + 1,
    );
    const [runs, stages] = await Promise.all([
      this.results.byRowIds(rows.flatMap((row) => [row.latestResultId, row.askedResultId])),
      findUnitStages(
        this.sequelize,
        rows.map((row) => row.unitId),
      ),
    ]);
    return toPage(
      rows,
      limit,
      (row) => row.latestResultId,
      (row) => this.toItem(row, runs, stages),
    );
  }

  async one(partNumber: string, serialNumber: string): Promise<UnitDto> {
    const product = this.catalogue.find(partNumber);
    const unit = product && (await Unit.findOne({ where: { productId: product.productId, serialNumber } }));
    if (product === undefined || unit == null)
      throw new NotFoundError(`The unit ${partNumber} ${serialNumber}`);
    const [results, lot] = await Promise.all([
      this.results.newest({ unitId: unit.unitId }, shownResults),
      unit.lotId === null ? null : Lot.findByPk(unit.lotId),
    ]);
    return {
      partNumber,
      serialNumber,
      lot: lot?.name ?? null,
      description: product.description,
      caution: cautionFor(product.spec),
      stages: product.stages.map((stage) => toUnitStage(stage, results)),
    };
  }

  private toItem(
    row: UnitRow,
    runs: ReadonlyMap<number, RunItemDto>,
    states: readonly UnitStageRow[],
  ): UnitItemDto {
    const { stages } = this.catalogue.find(row.partNumber)!;
    const latest = runs.get(row.latestResultId)!;
    return {
      partNumber: row.partNumber,
      serialNumber: row.serialNumber,
      lot: row.lot,
      lastTestedAt: latest.startedAt,
      latest,
      asked: runs.get(row.askedResultId)!,
      stages: stages.map((stage) => {
        const state = states.find(
          (candidate) => candidate.unitId === row.unitId && candidate.stageId === stage.stageId,
        );
        return { stage: stage.name, attempts: state?.attempts ?? 0, verdict: state?.verdict ?? null };
      }),
    };
  }
}

function toUnitStage({ name, maxAttempts }: CatalogueStage, results: readonly RunItemDto[]): UnitStageDto {
  const own = results
    .filter((result) => result.stage === name)
    .sort((a, b) => a.startedAt.localeCompare(b.startedAt) || (a.attempt ?? 0) - (b.attempt ?? 0));
  const attempts = own.filter((result) => result.attempt !== null).sort((a, b) => a.attempt! - b.attempt!);
  return { stage: name, maxAttempts, verdict: attempts.at(-1)?.verdict ?? null, results: own };
}
