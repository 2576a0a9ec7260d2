import { Inject, Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import type { MeasureJudgement, MeasureName } from '../analysis/analysis.types.js';
import { ENV } from '../config/config.module.js';
import type { Env } from '../config/env.js';
import { LiveService } from '../live/live.service.js';
import { Outbox } from '../mail/outbox.js';
import { type BreachMailOrder, enqueueBreachMails } from '../mail/outbox.queries.js';
import {
  addEvents,
  findUnclosed,
  markMailed,
  openBreaches,
  type UnclosedBreach,
} from './breach-recorder.queries.js';
import { breachEventText, howBad } from './breach-words.js';
import type { BreachMeasure } from './models/breach.model.js';

/** A newly stored production result with verdict fail. */
export interface FailedResult {
  /** Row id, not the station's name for it. */
  resultId: number;
  resultUuid: string;
  stageId: number;
  partNumber: string;
  stage: string;
  serialNumber: string;
  startedAt: number;
  receivedAt: number;
  seeded: boolean;
  judgement: readonly MeasureJudgement[];
  failedMeasures: readonly MeasureName[];
}

/** What became of one cause in this batch. */
export interface RecordedBreach {
  breachId: number;
  opened: boolean;
  mailed: boolean;
}

/** One result that broke one rule. */
interface Failure {
  causeKey: string;
  measure: BreachMeasure;
  judgement: MeasureJudgement | null;
  result: FailedResult;
}

const DAY_MS = 86_400_000;

/**
 * Turns failing results into breaches: one that isn't closed per product, stage and measure; every further
 * fail joins it. Works inside the transaction that stores the results, so neither exists without the other.
 */
@Injectable()
export class BreachRecorder {
  constructor(
    private readonly outbox: Outbox,
    private readonly live: LiveService,
    @Inject(ENV) private readonly env: Env,
  ) {}

  /** Statements per batch: 3, one more when a breach opens, two more when mails are written. */
  async record(transaction: Transaction, fails: readonly FailedResult[]): Promise<RecordedBreach[]> {
    const byCause = groupByCause(fails.flatMap(failuresOf));
    if (byCause.size === 0) return [];
    const known = await findUnclosed(transaction, [...byCause.keys()]);
    const missing = [...byCause].filter(([causeKey]) => !known.has(causeKey));
    const opened = await openBreaches(
      transaction,
      missing.map(([causeKey, [first]]) => newBreach(causeKey, first)),
    );
    const breaches = new Map([...known, ...opened]);
    await addEvents(transaction, eventRows(byCause, breaches));
    const mailed = await this.mail(transaction, byCause, breaches);
    return [...byCause.keys()].map((causeKey) => {
      const { breachId } = breaches.get(causeKey)!;
      return { breachId, opened: opened.has(causeKey), mailed: mailed.has(breachId) };
    });
  }

  /** Call once the transaction is committed: sends the mails and tells the dashboards. */
  afterCommit(recorded: readonly RecordedBreach[]): void {
    if (recorded.some(({ mailed }) => mailed)) this.outbox.wake();
    for (const { breachId } of recorded) this.live.publish({ topic: 'breaches', id: String(breachId) });
  }

  /** A breach mails once, at the first event that may: seeded and late ones tell nobody of what is long past. */
  private async mail(
    transaction: Transaction,
    byCause: ReadonlyMap<string, readonly Failure[]>,
    breaches: ReadonlyMap<string, UnclosedBreach>,
  ): Promise<Set<number>> {
    const orders: BreachMailOrder[] = [];
    for (const [causeKey, failures] of byCause) {
      const breach = breaches.get(causeKey)!;
      const reason = failures.find(({ result }) => isNews(result));
      if (breach.state === 'open' && breach.mailedAt === null && reason !== undefined) {
        const at = reason.result.receivedAt;
        orders.push({ breachId: breach.breachId, subject: subjectOf(reason), createdAt: at });
      }
    }
    if (orders.length === 0) return new Set();
    const mailed = await enqueueBreachMails(transaction, orders, new URL(this.env.publicUrl).hostname);
    await markMailed(transaction, mailed, orders[0]!.createdAt);
    return mailed;
  }
}

function failuresOf(result: FailedResult): Failure[] {
  const causeKey = (measure: BreachMeasure) => `stage ${result.stageId} ${measure}`;
  if (result.failedMeasures.length === 0) {
    return [{ causeKey: causeKey('stoppedOnFail'), measure: 'stoppedOnFail', judgement: null, result }];
  }
  return result.failedMeasures.map((measure) => ({
    causeKey: causeKey(measure),
    measure,
    judgement: result.judgement.find(({ name }) => name === measure) ?? null,
    result,
  }));
}

type Failures = [Failure, ...Failure[]];

function groupByCause(failures: readonly Failure[]): Map<string, Failures> {
  const groups = new Map<string, Failures>();
  for (const failure of failures) {
    const group = groups.get(failure.causeKey);
    if (group) group.push(failure);
    else groups.set(failure.causeKey, [failure]);
  }
  return groups;
}

function newBreach(causeKey: string, { measure, result }: Failure) {
  return { causeKey, measure, stageId: result.stageId, openedAt: result.receivedAt };
}

function eventRows(byCause: ReadonlyMap<string, Failures>, breaches: ReadonlyMap<string, UnclosedBreach>) {
  return [...byCause].flatMap(([causeKey, failures]) =>
    failures.map(({ judgement, result }) => ({
      breachId: breaches.get(causeKey)!.breachId,
      resultId: result.resultId,
      at: result.receivedAt,
      text: breachEventText(judgement),
    })),
  );
}

const isNews = ({ seeded, startedAt, receivedAt }: FailedResult): boolean =>
  !seeded && receivedAt - startedAt <= DAY_MS;

function subjectOf({ judgement, result }: Failure): string {
  return `${result.partNumber} at ${result.stage}: ${howBad(judgement)} (unit ${result.serialNumber})`;
}
