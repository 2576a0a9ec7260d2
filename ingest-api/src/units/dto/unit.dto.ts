import type { Verdict } from '../../analysis/analysis.types.js';
import { RunItemDto } from '../../results/dto/run-item.dto.js';

export class UnitStageStateDto {
  stage!: string;
  /** Counted results so far. */
  attempts!: number;
  /** Of the latest attempt; null when there is none. */
  verdict!: Verdict | null;
}

export class UnitItemDto {
  partNumber!: string;
  serialNumber!: string;
  lot!: string | null;
  lastTestedAt!: string;
  latest!: RunItemDto;
  /** The result that the question is about (`of`): the latest one, or a first attempt. */
  asked!: RunItemDto;
  stages!: UnitStageStateDto[];
}

export class UnitPageDto {
  items!: UnitItemDto[];
  nextCursor!: string | null;
}

export class UnitStageDto {
  stage!: string;
  maxAttempts!: number;
  /** Of the latest attempt; null when there is none. */
  verdict!: Verdict | null;
  /** All results, the oldest first, golden and practice ones included. */
  results!: RunItemDto[];
}

export class UnitDto {
  partNumber!: string;
  serialNumber!: string;
  lot!: string | null;
  description!: string;
  /** Safety caution of the product, if it needs one. */
  caution!: string | null;
  stages!: UnitStageDto[];
}
