import { Inject, Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { DateTime } from 'luxon';
import { Sequelize } from 'sequelize-typescript';
import { rolledThroughput } from '../analysis/yield/rolled-throughput.js';
import { yieldShare } from '../analysis/yield/yield-share.js';
import { NO_UNITS, type YieldCounts } from '../analysis/yield/yield.types.js';
import { BreachesService } from '../breaches/breaches.service.js';
import { CLOCK, type Clock, ENV } from '../config/config.module.js';
import type { Env } from '../config/env.js';
import type { CatalogueProduct } from '../products/catalogue.js';
import { CatalogueService } from '../products/catalogue.service.js';
import { ResultReadsService } from '../results/result-reads.service.js';
import { StationActivityService } from '../stations/station-activity.service.js';
import { findStageYields } from '../yield/stage-yields.queries.js';
import { TodayDto, type TodayProductDto, type TodayStageDto, type YieldDto } from './dto/today.dto.js';
import { findWorse } from './find-worse.js';

const RECENT_COUNT = 30;
const DAYS_BEFORE = 7;

type CountsByStage = Map<number, YieldCounts>;

@Injectable()
export class TodayService {
  constructor(
    @InjectConnection() private readonly sequelize: Sequelize,
    private readonly catalogue: CatalogueService,
    private readonly breaches: BreachesService,
    private readonly results: ResultReadsService,
    private readonly activity: StationActivityService,
    @Inject(ENV) private readonly env: Env,
    @Inject(CLOCK) private readonly now: Clock,
  ) {}

  async today(): Promise<TodayDto> {
    const now = DateTime.fromMillis(this.now(), { zone: this.env.timeZone });
    const start = now.startOf('day');
    const [counts, before, openBreaches, recent, stations] = await Promise.all([
      this.counts(start, start.plus({ days: 1 })),
      this.counts(start.minus({ days: DAYS_BEFORE }), start),
      this.breaches.findUnclosed(50),
      this.results.newest({}, RECENT_COUNT),
      this.activity.all(),
    ]);
    const products = this.catalogue.all().map((product) => toProduct(product, counts, before));
    return {
      date: start.toISODate()!,
      timeZone: this.env.timeZone,
      products,
      worse: findWorse(products, stations, start.toMillis(), now.toMillis()),
      openBreaches,
      recent,
    };
  }

  private async counts(from: DateTime, to: DateTime): Promise<CountsByStage> {
    const rows = await findStageYields(this.sequelize, from.toMillis(), to.toMillis());
    return new Map(rows.map((row) => [row.stageId, row]));
  }
}

function toProduct(product: CatalogueProduct, counts: CountsByStage, before: CountsByStage): TodayProductDto {
  const stages = product.stages.map((stage): TodayStageDto => {
    const own = counts.get(stage.stageId) ?? NO_UNITS;
    const earlier = before.get(stage.stageId) ?? NO_UNITS;
    return {
      stage: stage.name,
      target: stage.yieldTarget,
      firstPass: yieldShare(own.firstPassed, own.total),
      final: yieldShare(own.latestPassed, own.total),
      failed: own.firstFailed,
      notProven: own.firstNotProven,
      openUnits: own.open,
      previous: yieldShare(earlier.firstPassed, earlier.total),
    };
  });
  return {
    partNumber: product.partNumber,
    description: product.description,
    stages,
    rolledThroughput: toRolled(stages),
  };
}

/** Null until every stage has counted something, and pointless with one stage. */
function toRolled(stages: readonly TodayStageDto[]): YieldDto | null {
  if (stages.length < 2) return null;
  const rolled = rolledThroughput(stages.map(({ firstPass: { passed, total } }) => ({ passed, total })));
  const last = stages.at(-1)!.firstPass;
  return rolled === null ? null : { passed: last.passed, total: last.total, ...rolled };
}
