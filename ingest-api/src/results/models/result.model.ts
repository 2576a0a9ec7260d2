import { Column, DataType, Model, Table } from 'sequelize-typescript';
import type {
  Bound,
  MeasureJudgement,
  MeasureName,
  Outcome,
  Verdict,
} from '../../analysis/analysis.types.js';
import type { ResultAnswer, RunKind } from '../result.types.js';
import { booleanColumn, jsonColumn } from '../../database/columns.js';

/** One accepted sweep with its judgement. Times are epoch milliseconds; figures are SI. */
@Table({ tableName: 'results' })
export class Result extends Model {
  /** Grows with arrival; what pages are ordered by. */
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true }) declare resultId: number;
  /** The name that the station gave it. */
  @Column(DataType.TEXT) declare resultUuid: string;
  @Column(DataType.INTEGER) declare stationId: number;
  @Column(DataType.INTEGER) declare apiKeyId: number | null;
  @Column(DataType.INTEGER) declare productId: number;
  @Column(DataType.INTEGER) declare stageId: number;
  @Column(DataType.INTEGER) declare unitId: number;
  @Column(DataType.INTEGER) declare lotId: number | null;
  @Column(DataType.TEXT) declare runKind: RunKind;
  @Column(DataType.TEXT) declare outcome: Outcome;
  /** Belongs to the yields: production, judged, neither aborted nor voided. */
  @Column(booleanColumn('counted')) declare counted: boolean;
  @Column(DataType.INTEGER) declare attempt: number | null;
  @Column(DataType.TEXT) declare verdict: Verdict;
  @Column(DataType.TEXT) declare firstVerdict: Verdict;
  @Column(DataType.INTEGER) declare startedAt: number;
  @Column(DataType.INTEGER) declare finishedAt: number | null;
  @Column(DataType.INTEGER) declare sentAt: number | null;
  @Column(DataType.INTEGER) declare receivedAt: number;
  @Column(DataType.TEXT) declare fixture: string | null;
  @Column(DataType.TEXT) declare programName: string | null;
  @Column(DataType.TEXT) declare programVersion: string | null;
  @Column(DataType.INTEGER) declare limitSetVersion: number | null;
  @Column(DataType.INTEGER) declare testPlanVersion: number | null;
  @Column(booleanColumn('seeded')) declare seeded: boolean;
  @Column(DataType.INTEGER) declare voidedAt: number | null;
  @Column(DataType.REAL) declare conductanceSiemens: number | null;
  /** Expanded, k ≈ 2. */
  @Column(DataType.REAL) declare conductanceUncertainty: number | null;
  @Column(DataType.REAL) declare limitSiemens: number | null;
  @Column(DataType.REAL) declare impedanceOhms: number | null;
  @Column(DataType.TEXT) declare impedanceBound: Bound;
  @Column(DataType.REAL) declare referenceAmps: number | null;
  @Column(jsonColumn('failedMeasures')) declare failedMeasures: MeasureName[];
  @Column(jsonColumn('flags')) declare flags: string[];
  @Column(jsonColumn('judgement')) declare judgement: MeasureJudgement[];
  @Column(jsonColumn('answer')) declare answer: ResultAnswer;
}
