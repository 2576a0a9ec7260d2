import { Column, DataType, Model, Table } from 'sequelize-typescript';
import type { MeasureName } from '../../analysis/analysis.types.js';

export const breachStates = ['open', 'acknowledged', 'closed'] as const;
export type BreachState = (typeof breachStates)[number];

/** What was broken: a measure's limit, or the station stopped the unit without a measure to blame. */
export type BreachMeasure = MeasureName | 'stoppedOnFail';

/** Something that broke a limit and wants a person; one that isn't closed per cause. */
@Table({ tableName: 'breaches' })
export class Breach extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true }) declare breachId: number;
  /** What makes two events the same breach: `stage <id> <measure>`. */
  @Column(DataType.TEXT) declare causeKey: string;
  @Column(DataType.INTEGER) declare stageId: number;
  @Column(DataType.TEXT) declare measure: BreachMeasure;
  @Column(DataType.TEXT) declare state: BreachState;
  @Column(DataType.INTEGER) declare openedAt: number;
  @Column(DataType.INTEGER) declare lastEventAt: number;
  @Column(DataType.INTEGER) declare eventCount: number;
  @Column(DataType.INTEGER) declare latestResultId: number | null;
  /** When its mails were put into the outbox; null while nobody was told. */
  @Column(DataType.INTEGER) declare mailedAt: number | null;
  @Column(DataType.INTEGER) declare acknowledgedAt: number | null;
  @Column(DataType.TEXT) declare acknowledgedBy: string | null;
  @Column(DataType.TEXT) declare note: string | null;
  @Column(DataType.INTEGER) declare closedAt: number | null;
  @Column(DataType.TEXT) declare closedBy: string | null;
  @Column(DataType.TEXT) declare cause: string | null;
  @Column(DataType.TEXT) declare action: string | null;
}
