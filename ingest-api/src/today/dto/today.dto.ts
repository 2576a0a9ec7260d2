import { BreachDto } from '../../breaches/dto/breach.dto.js';
import { RunItemDto } from '../../results/dto/run-item.dto.js';

/** A share with its Wilson 95 % interval; all null when nothing was counted. */
export class YieldDto {
  passed!: number;
  total!: number;
  share!: number | null;
  low!: number | null;
  high!: number | null;
}

export class TodayStageDto {
  stage!: string;
  /** First-pass yield wanted, as a share. */
  target!: number | null;
  firstPass!: YieldDto;
  final!: YieldDto;
  /** Units whose first attempt failed. */
  failed!: number;
  /** Units whose first attempt could not be told. */
  notProven!: number;
  /** Units that have not passed yet and may be tested again. */
  openUnits!: number;
  /** First-pass yield of the seven site days before. */
  previous!: YieldDto;
}

export class TodayProductDto {
  partNumber!: string;
  description!: string;
  stages!: TodayStageDto[];
  /** Product of the stages' first-pass yields; `passed` and `total` are those of the last stage. */
  rolledThroughput!: YieldDto | null;
}

export class TodayChangeDto {
  kind!: 'firstPass' | 'notProven' | 'silent';
  text!: string;
  partNumber!: string | null;
  stage!: string | null;
  station!: string | null;
}

export class TodayDto {
  /**
   * Day in the site's time zone.
   * @example "2026-12-01"
   */
  date!: string;
  timeZone!: string;
  products!: TodayProductDto[];
  /** What is getting worse. */
  worse!: TodayChangeDto[];
  openBreaches!: BreachDto[];
  /** The newest results, the newest first. */
  recent!: RunItemDto[];
}
