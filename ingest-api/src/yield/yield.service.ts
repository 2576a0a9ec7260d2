import { Inject, Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { Sequelize } from 'sequelize-typescript';
import { describeMeasure } from '../analysis/judging/measure-names.js';
import type { MeasureName } from '../analysis/analysis.types.js';
import { ENV } from '../config/config.module.js';
import type { Env } from '../config/env.js';
import { CatalogueService } from '../products/catalogue.service.js';
import { toCohort, toGroups, toRolled } from './cohorts.js';
import type { YieldQueryDto } from './dto/yield-query.dto.js';
import type { FailingMeasureDto, YieldReportDto } from './dto/yield-report.dto.js';
import { findMarkers } from './markers.js';
import { type TimeBucket, timeBuckets } from './time-buckets.js';
import {
  type CohortRow,
  countAborts,
  type FailingMeasureRow,
  findCohortCounts,
  findFailingMeasures,
  findNewPrograms,
} from './yield-report.queries.js';

/** Yields over a period: the trend, its splits, what failed, what retests gained. */
@Injectable()
export class YieldService {
  constructor(
    @InjectConnection() private readonly sequelize: Sequelize,
    private readonly catalogue: CatalogueService,
    @Inject(ENV) private readonly env: Env,
  ) {}

  async report({ from, to, by = 'day', split, ...filter }: YieldQueryDto): Promise<YieldReportDto> {
    const buckets = timeBuckets(from, to, by, this.env.timeZone);
    const [startAt, endAt] = [buckets[0]!.startAt, buckets.at(-1)!.endAt];
    const [rows, failing, aborts, programs] = await Promise.all([
      findCohortCounts(this.sequelize, buckets, filter, split),
      findFailingMeasures(this.sequelize, buckets, filter),
      countAborts(this.sequelize, startAt, endAt, filter),
      findNewPrograms(this.sequelize, startAt, endAt),
    ]);
    const stageIds = this.stagesOf(filter.partNumber, filter.stage);
    const whole = toCohort(rows);
    return {
      from,
      to,
      by,
      timeZone: this.env.timeZone,
      whole,
      rolledThroughput: toRolled(rows, stageIds),
      buckets: buckets.map((bucket, index) =>
        this.toBucket(
          bucket,
          rows.filter((row) => row.bucket === index),
          stageIds,
        ),
      ),
      groups: split === undefined ? [] : toGroups(rows, buckets.length),
      failingMeasures: toFailingMeasures(failing),
      retests: {
        retested: sum(rows.map((row) => row.retested)),
        total: whole.firstPass.total,
        passedOnSecond: sum(rows.map((row) => row.passedOnSecond)),
      },
      aborts,
      markers: findMarkers(this.catalogue.all(), programs, { startAt, endAt, ...filter }),
    };
  }

  private toBucket(
    { startAt, endAt }: TimeBucket,
    rows: readonly CohortRow[],
    stageIds: readonly number[],
  ): YieldReportDto['buckets'][number] {
    return {
      startAt: new Date(startAt).toISOString(),
      endAt: new Date(endAt).toISOString(),
      ...toCohort(rows),
      rolledThroughput: toRolled(rows, stageIds),
    };
  }

  /** Stages that a rolled throughput runs over: all of one product; none for several products or one stage. */
  private stagesOf(partNumber: string | undefined, stage: string | undefined): number[] {
    const product =
      partNumber === undefined || stage !== undefined ? undefined : this.catalogue.find(partNumber);
    return product?.stages.map(({ stageId }) => stageId) ?? [];
  }
}

const sum = (counts: readonly number[]): number => counts.reduce((total, count) => total + count, 0);

function toFailingMeasures(rows: readonly FailingMeasureRow[]): FailingMeasureDto[] {
  const all = sum(rows.map(({ units }) => units));
  let soFar = 0;
  return rows.map(({ measure, units }) => {
    soFar += units;
    return {
      measure,
      label: describeMeasure(measure as MeasureName).label,
      units,
      cumulativeShare: soFar / all,
    };
  });
}
