import { Inject, Injectable, type OnApplicationShutdown, type OnModuleInit } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { Interval } from '@nestjs/schedule';
import { Sequelize } from 'sequelize-typescript';
import { CLOCK, type Clock } from '../config/config.module.js';
import { Writer } from '../database/writer.js';
import { Heartbeat } from './models/heartbeat.model.js';

export interface LastHeartbeat {
  at: number;
  clockSkewMs: number | null;
}

const SAVE_MS = 30_000;

/** Signs of life, held in memory and written now and then: one may be lost at a power cut, none matters. */
@Injectable()
export class HeartbeatsService implements OnModuleInit, OnApplicationShutdown {
  private readonly last = new Map<number, LastHeartbeat>();
  private readonly unsaved = new Set<number>();

  constructor(
    // Asked for so that the models are bound to their database before the first read.
    @InjectConnection() _sequelize: Sequelize,
    private readonly writer: Writer,
    @Inject(CLOCK) private readonly now: Clock,
  ) {}

  async onModuleInit(): Promise<void> {
    for (const { stationId, at, clockSkewMs } of await Heartbeat.findAll())
      this.last.set(stationId, { at, clockSkewMs });
  }

  onApplicationShutdown(): Promise<void> {
    return this.save();
  }

  /** Notes that the station lives; `sentAt` is its own clock, epoch ms. */
  beat(stationId: number, sentAt: number | null): LastHeartbeat {
    const at = this.now();
    const heartbeat = { at, clockSkewMs: sentAt === null ? null : at - sentAt };
    this.last.set(stationId, heartbeat);
    this.unsaved.add(stationId);
    return heartbeat;
  }

  of(stationId: number): LastHeartbeat | null {
    return this.last.get(stationId) ?? null;
  }

  @Interval(SAVE_MS)
  async save(): Promise<void> {
    if (this.unsaved.size === 0) return;
    const rows = [...this.unsaved].map((stationId) => ({ stationId, ...this.last.get(stationId)! }));
    this.unsaved.clear();
    await this.writer
      .run((transaction) =>
        Heartbeat.bulkCreate(rows, { transaction, updateOnDuplicate: ['at', 'clockSkewMs'] }),
      )
      .catch(() => undefined); // Lost signs of life are no loss; the next ones come soon.
  }
}
