import { ApiProperty } from '@nestjs/swagger';
import { RunItemDto } from '../../results/dto/run-item.dto.js';
import { breachTitle } from '../breach-words.js';
import type { BreachRow } from '../breaches.queries.js';
import { type BreachMeasure, type BreachState, breachStates } from '../models/breach.model.js';

/** Something that broke a limit and wants a person; one that isn't closed per product, stage and measure. */
export class BreachDto {
  /** @example 12 */
  breachId!: number;
  /** @example "Output impedance out of limits: FH-R500-W at final" */
  title!: string;
  /** @example "FH-R500-W" */
  partNumber!: string;
  /** @example "final" */
  stage!: string;
  /**
   * The measure whose limit was broken, or `stoppedOnFail`.
   * @example "outputImpedance"
   */
  @ApiProperty({ type: String })
  measure!: BreachMeasure;
  @ApiProperty({ enum: breachStates })
  state!: BreachState;
  openedAt!: string;
  lastEventAt!: string;
  /** Results that belong to it. */
  eventCount!: number;
  acknowledgedAt!: string | null;
  /** Mail address of the person. */
  acknowledgedBy!: string | null;
  note!: string | null;
  closedAt!: string | null;
  /** Mail address of the person. */
  closedBy!: string | null;
  cause!: string | null;
  /** What was done so that it doesn't return. */
  action!: string | null;
  /** The result that joined it last. */
  latest!: RunItemDto | null;
}

const iso = (time: number): string => new Date(time).toISOString();
const isoOrNull = (time: number | null): string | null => (time === null ? null : iso(time));

export function toBreachDto(row: BreachRow, latest: RunItemDto | null): BreachDto {
  return {
    breachId: row.breachId,
    title: breachTitle(row.measure, row.partNumber, row.stage),
    partNumber: row.partNumber,
    stage: row.stage,
    measure: row.measure,
    state: row.state,
    openedAt: iso(row.openedAt),
    lastEventAt: iso(row.lastEventAt),
    eventCount: row.eventCount,
    acknowledgedAt: isoOrNull(row.acknowledgedAt),
    acknowledgedBy: row.acknowledgedBy,
    note: row.note,
    closedAt: isoOrNull(row.closedAt),
    closedBy: row.closedBy,
    cause: row.cause,
    action: row.action,
    latest,
  };
}
