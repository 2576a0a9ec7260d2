import { QueryTypes } from 'sequelize';
import type { Sequelize } from 'sequelize-typescript';
import { inList } from '../database/sql.js';
import type { Breach, BreachState } from './models/breach.model.js';

export type BreachRow = Pick<
  Breach,
  | 'breachId'
  | 'measure'
  | 'state'
  | 'openedAt'
  | 'lastEventAt'
  | 'eventCount'
  | 'latestResultId'
  | 'acknowledgedAt'
  | 'acknowledgedBy'
  | 'note'
  | 'closedAt'
  | 'closedBy'
  | 'cause'
  | 'action'
> & { partNumber: string; stage: string };

export interface BreachFilter {
  states: readonly BreachState[];
  breachId?: number;
  /** Only those opened before this one. */
  before?: number | null;
}

/** Newest opened first. */
export function findBreaches(
  sequelize: Sequelize,
  filter: BreachFilter,
  limit: number,
): Promise<BreachRow[]> {
  const { states, breachId, before } = filter;
  return sequelize.query<BreachRow>(
    `SELECT breach_id AS breachId, measure, state, opened_at AS openedAt, last_event_at AS lastEventAt,
       event_count AS eventCount, latest_result_id AS latestResultId, acknowledged_at AS acknowledgedAt,
       acknowledged_by AS acknowledgedBy, note, closed_at AS closedAt, closed_by AS closedBy, cause, action,
       products.part_number AS partNumber, stages.name AS stage
     FROM breaches JOIN stages USING (stage_id) JOIN products USING (product_id)
     WHERE state ${inList('$states')}
       ${breachId === undefined ? '' : 'AND breach_id = $breachId'}
       ${before == null ? '' : 'AND breach_id < $before'}
     ORDER BY breach_id DESC LIMIT $limit`,
    {
      bind: {
        states: JSON.stringify(states),
        limit,
        ...(breachId !== undefined && { breachId }),
        ...(before != null && { before }),
      },
      type: QueryTypes.SELECT,
    },
  );
}
