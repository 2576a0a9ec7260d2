import { IsIn, IsOptional, IsString, MaxLength } from 'class-validator';
import type { Verdict } from '../../analysis/analysis.types.js';
import { PageQueryDto } from '../../common/page-query.dto.js';
import { ProblemErrorDto } from '../../common/problem.dto.js';

const intakeKinds = ['all', 'accepted', 'refused'] as const;

export class IntakeQueryDto extends PageQueryDto {
  @IsOptional() @IsIn(intakeKinds) kind?: (typeof intakeKinds)[number] = 'all';
  @IsOptional() @IsString() @MaxLength(64) station?: string;
}

export class IntakeItemDto {
  /**
   * Names the entry: `r…` accepted, `x…` refused.
   * @example "x12"
   */
  intakeId!: string;
  kind!: 'accepted' | 'refused';
  receivedAt!: string;
  /** Of the newest time that the very same post came. */
  lastReceivedAt!: string;
  /** How often it came. */
  count!: number;
  station!: string;
  /** HTTP status that it was answered with. */
  status!: number;
  resultId!: string | null;
  partNumber!: string | null;
  serialNumber!: string | null;
  verdict!: Verdict | null;
  /** Why it was refused, place by place. */
  errors!: ProblemErrorDto[];
}

export class IntakePageDto {
  items!: IntakeItemDto[];
  nextCursor!: string | null;
}

export class RefusedPostDto extends IntakeItemDto {
  title!: string;
  detail!: string;
  /** As received; cut off when it was too long to keep whole. */
  body!: string;
  bodyBytes!: number;
  bodyTruncated!: boolean;
}
