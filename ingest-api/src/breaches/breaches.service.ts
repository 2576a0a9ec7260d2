import { Inject, Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import type { Transaction } from 'sequelize';
import type { Sequelize } from 'sequelize-typescript';
import { AuditService } from '../audit/audit.service.js';
import type { Person } from '../auth/principals.js';
import { type Page, readCursor, toPage } from '../common/cursor.js';
import { ConflictError, NotFoundError } from '../common/errors.js';
import { CLOCK, type Clock } from '../config/config.module.js';
import { Writer } from '../database/writer.js';
import { LiveService } from '../live/live.service.js';
import { OutboxMail } from '../mail/models/outbox-mail.model.js';
import { type RunItemDto, toRunItemDto } from '../results/dto/run-item.dto.js';
import { findRunItems } from '../results/run-items.queries.js';
import { type BreachRow, findBreaches } from './breaches.queries.js';
import { type BreachDetailDto, type BreachEventDto, toOutboxMailDto } from './dto/breach-detail.dto.js';
import { type BreachDto, toBreachDto } from './dto/breach.dto.js';
import type { BreachQueryDto } from './dto/breach-query.dto.js';
import type { CloseBreachDto } from './dto/close-breach.dto.js';
import { BreachEvent } from './models/breach-event.model.js';
import { Breach, breachStates } from './models/breach.model.js';

const EVENTS_SHOWN = 50;

/** The life of a breach after it was opened: shown, acknowledged, closed. */
@Injectable()
export class BreachesService {
  constructor(
    private readonly writer: Writer,
    private readonly audit: AuditService,
    private readonly live: LiveService,
    @InjectConnection() private readonly sequelize: Sequelize,
    @Inject(CLOCK) private readonly clock: Clock,
  ) {}

  async list({ state = 'all', cursor, limit = 50 }: BreachQueryDto): Promise<Page<BreachDto>> {
    const states = state === 'all' ? breachStates : [state];
    const rows = await findBreaches(this.sequelize, { states, before: readCursor(cursor) }, limit + 1);
    const { items, nextCursor } = toPage(
      rows,
      limit,
      (row) => row.breachId,
      (row) => row,
    );
    return { items: await this.toDtos(items), nextCursor };
  }

  /** What still wants a person, newest opened first. */
  async findUnclosed(limit: number): Promise<BreachDto[]> {
    return this.toDtos(await findBreaches(this.sequelize, { states: ['open', 'acknowledged'] }, limit));
  }

  async detail(breachId: number): Promise<BreachDetailDto> {
    const [row] = await findBreaches(this.sequelize, { states: breachStates, breachId }, 1);
    if (row === undefined) throw new NotFoundError(`Breach ${breachId}`);
    const [breach] = await this.toDtos([row]);
    const mails = await OutboxMail.findAll({ where: { breachId }, order: [['mailId', 'DESC']] });
    return { ...breach!, events: await this.events(breachId), mails: mails.map(toOutboxMailDto) };
  }

  async acknowledge(breachId: number, note: string, person: Person): Promise<BreachDetailDto> {
    await this.writer.run(async (transaction) => {
      const breach = await requireUnclosed(breachId, transaction);
      if (breach.state === 'acknowledged') {
        const detail = `${breach.acknowledgedBy} acknowledged it already.`;
        throw new ConflictError('breach_acknowledged', detail);
      }
      const acknowledged = { acknowledgedAt: this.clock(), acknowledgedBy: person.email, note };
      await breach.update({ state: 'acknowledged', ...acknowledged }, { transaction });
      await this.note(transaction, person, 'breach.acknowledged', breachId, note);
    });
    return this.changed(breachId);
  }

  async close(breachId: number, { cause, action }: CloseBreachDto, person: Person): Promise<BreachDetailDto> {
    await this.writer.run(async (transaction) => {
      const breach = await requireUnclosed(breachId, transaction);
      const closed = { closedAt: this.clock(), closedBy: person.email, cause, action };
      await breach.update({ state: 'closed', ...closed }, { transaction });
      await this.note(transaction, person, 'breach.closed', breachId, `Cause: ${cause} Action: ${action}`);
    });
    return this.changed(breachId);
  }

  private changed(breachId: number): Promise<BreachDetailDto> {
    this.live.publish({ topic: 'breaches', id: String(breachId) });
    return this.detail(breachId);
  }

  private note(
    transaction: Transaction,
    person: Person,
    action: string,
    breachId: number,
    detail: string,
  ): Promise<void> {
    return this.audit.record(transaction, {
      actor: person.email,
      action,
      subject: `breach ${breachId}`,
      detail,
    });
  }

  private async events(breachId: number): Promise<BreachEventDto[]> {
    const events = await BreachEvent.findAll({
      where: { breachId },
      order: [['breachEventId', 'DESC']],
      limit: EVENTS_SHOWN,
      raw: true,
    });
    const runs = await this.runs(events.map(({ resultId }) => resultId));
    return events.map(({ at, text, resultId }) => ({
      at: new Date(at).toISOString(),
      text,
      run: runs.get(resultId)!,
    }));
  }

  private async toDtos(rows: readonly BreachRow[]): Promise<BreachDto[]> {
    const runs = await this.runs(rows.flatMap(({ latestResultId }) => latestResultId ?? []));
    return rows.map((row) => toBreachDto(row, (row.latestResultId && runs.get(row.latestResultId)) || null));
  }

  private async runs(resultIds: readonly number[]): Promise<Map<number, RunItemDto>> {
    if (resultIds.length === 0) return new Map();
    const rows = await findRunItems(this.sequelize, { resultIds }, resultIds.length);
    return new Map(rows.map((row) => [row.resultId, toRunItemDto(row)]));
  }
}

async function requireUnclosed(breachId: number, transaction: Transaction): Promise<Breach> {
  const breach = await Breach.findByPk(breachId, { transaction });
  if (breach === null) throw new NotFoundError(`Breach ${breachId}`);
  if (breach.state === 'closed') {
    throw new ConflictError(
      'breach_closed',
      `${breach.closedBy} closed it already. A new fail opens a new breach.`,
    );
  }
  return breach;
}
