import { Inject, Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { DateTime } from 'luxon';
import { Sequelize } from 'sequelize-typescript';
import { AuditService } from '../audit/audit.service.js';
import { ConflictError } from '../common/errors.js';
import { CLOCK, type Clock, ENV } from '../config/config.module.js';
import type { Env } from '../config/env.js';
import { Writer } from '../database/writer.js';
import { LiveService } from '../live/live.service.js';
import { CatalogueService } from '../products/catalogue.service.js';
import { toRunItemDto } from '../results/dto/run-item.dto.js';
import { findRunItems } from '../results/run-items.queries.js';
import type { CreateStationDto, InstrumentDto, StationDto } from './dto/station.dto.js';
import { GoldenChecksService } from './golden-checks.service.js';
import { Instrument } from './models/instrument.model.js';
import { Station } from './models/station.model.js';
import { type StationActivity, StationActivityService } from './station-activity.service.js';
import { StationRegister } from './station-register.service.js';

/** A station that posted within this time counts as posting. */
const POSTING_MS = 10 * 60_000;

@Injectable()
export class StationsService {
  constructor(
    @InjectConnection() private readonly sequelize: Sequelize,
    private readonly register: StationRegister,
    private readonly activity: StationActivityService,
    private readonly catalogue: CatalogueService,
    private readonly goldenChecks: GoldenChecksService,
    private readonly writer: Writer,
    private readonly audit: AuditService,
    private readonly live: LiveService,
    @Inject(ENV) private readonly env: Env,
    @Inject(CLOCK) private readonly now: Clock,
  ) {}

  async list(): Promise<StationDto[]> {
    const activity = await this.activity.all();
    const latestIds = activity.flatMap(({ latestResultId }) => latestResultId ?? []);
    const rows = await findRunItems(this.sequelize, { resultIds: latestIds }, latestIds.length);
    return activity.map((one) => {
      const latest = rows.find((row) => row.resultId === one.latestResultId);
      return { ...this.describe(one), latest: latest === undefined ? null : toRunItemDto(latest) };
    });
  }

  async create({ station, line }: CreateStationDto, actor: string): Promise<StationDto> {
    await this.writer.run(async (transaction) => {
      // Asked inside the writer, where nobody can come between.
      if ((await Station.count({ where: { name: station }, transaction })) > 0) {
        throw new ConflictError('station_exists', `There is a station "${station}" already.`);
      }
      await Station.create({ name: station, line, active: true, createdAt: this.now() }, { transaction });
      await this.audit.record(transaction, {
        actor,
        action: 'station.created',
        subject: station,
        detail: line,
      });
    });
    await this.register.reload();
    this.live.publish({ topic: 'stations', id: station });
    return (await this.list()).find((one) => one.station === station)!;
  }

  private describe(activity: StationActivity): Omit<StationDto, 'latest'> {
    const { station, lastPostAt, lastHeartbeatAt } = activity;
    const { stationId, line, active } = this.register.byId(activity.stationId);
    const state =
      lastPostAt === null ? 'neverPosted' : this.now() - lastPostAt <= POSTING_MS ? 'posting' : 'quiet';
    return {
      station,
      line,
      active,
      state,
      lastPostAt: lastPostAt === null ? null : new Date(lastPostAt).toISOString(),
      lastHeartbeatAt: lastHeartbeatAt === null ? null : new Date(lastHeartbeatAt).toISOString(),
      postsToday: activity.postsToday,
      refusedToday: activity.refusedToday,
      clockSkewSeconds: activity.clockSkewSeconds,
      goldenDueAt: this.goldenDueAt(stationId),
      instruments: this.register.instrumentsOf(stationId).map((instrument) => this.toInstrument(instrument)),
    };
  }

  /** The earliest golden check owed, over the products whose golden units this station ever measured. */
  private goldenDueAt(stationId: number): string | null {
    const due = this.catalogue.all().flatMap((product) => this.goldenChecks.dueAt(stationId, product) ?? []);
    return due.length === 0 ? null : new Date(Math.min(...due)).toISOString();
  }

  private toInstrument(instrument: Instrument): InstrumentDto {
    const {
      kind,
      serialNumber,
      model,
      resolution,
      readingAccuracyPercent,
      rangeAccuracyPercent,
      calibrationDueOn,
    } = instrument;
    const today = DateTime.fromMillis(this.now(), { zone: this.env.timeZone }).toISODate()!;
    return {
      kind,
      serialNumber,
      model,
      resolution,
      readingAccuracyPercent,
      rangeAccuracyPercent,
      calibrationDueOn,
      calibrationOverdue: calibrationDueOn !== null && calibrationDueOn < today,
    };
  }
}
