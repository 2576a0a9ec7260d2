import { QueryTypes } from 'sequelize';
import type { Sequelize } from 'sequelize-typescript';
import type { BreachMeasure } from '../breaches/models/breach.model.js';
import type { Slope } from './slope-in-words.js';

export interface FailingUnit extends Slope {
  resultUuid: string;
  serialNumber: string;
  lot: string | null;
  station: string;
  startedAt: number;
  /** The judging of the broken measure in words. */
  text: string;
}

/** All that a breach's mail tells. */
export interface BreachMailFacts {
  breachId: number;
  measure: BreachMeasure;
  partNumber: string;
  stage: string;
  openedAt: number;
  eventCount: number;
  /** The unit that opened it. */
  first: FailingUnit;
  /** The latest others, newest first. */
  others: FailingUnit[];
}

const OTHERS_SHOWN = 5;

const breachSql = `
  SELECT breaches.breach_id AS breachId, measure, products.part_number AS partNumber, stages.name AS stage,
    opened_at AS openedAt, event_count AS eventCount
  FROM breaches JOIN stages USING (stage_id) JOIN products USING (product_id)
  WHERE breaches.breach_id = ?`;

const unitColumns = `
  SELECT results.result_uuid AS resultUuid, units.serial_number AS serialNumber, lots.name AS lot, stations.name AS station,
    results.started_at AS startedAt, breach_events.text, results.conductance_siemens AS conductanceSiemens,
    results.conductance_uncertainty AS conductanceUncertainty, results.limit_siemens AS limitSiemens
  FROM breach_events
    JOIN results USING (result_id)
    JOIN units USING (unit_id)
    JOIN stations ON stations.station_id = results.station_id
    LEFT JOIN lots ON lots.lot_id = results.lot_id
  WHERE breach_events.breach_id = ?`;

/** @throws Error when the breach isn't there: no mail can be made of it. */
export async function loadBreachMail(sequelize: Sequelize, breachId: number): Promise<BreachMailFacts> {
  const select = <Row extends object>(sql: string, ...replacements: number[]) =>
    sequelize.query<Row>(sql, { replacements, type: QueryTypes.SELECT });
  const [breach] = await select<Omit<BreachMailFacts, 'first' | 'others'>>(breachSql, breachId);
  const [first] = await select<FailingUnit>(`${unitColumns} ORDER BY breach_event_id LIMIT 1`, breachId);
  if (breach === undefined || first === undefined)
    throw new Error(`Breach ${breachId} has no event to tell of`);
  const others = await select<FailingUnit>(
    `${unitColumns} ORDER BY breach_event_id DESC LIMIT ?`,
    breachId,
    Math.min(OTHERS_SHOWN, breach.eventCount - 1),
  );
  return { ...breach, first, others };
}
