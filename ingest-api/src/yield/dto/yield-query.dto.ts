import { IsIn, IsOptional, IsString, Matches, MaxLength } from 'class-validator';

const bucketKinds = ['hour', 'day', 'week'] as const;
export type BucketKind = (typeof bucketKinds)[number];

const splitKinds = ['product', 'stage', 'station', 'fixture', 'lot', 'programVersion'] as const;
export type SplitKind = (typeof splitKinds)[number];

const DAY_FORM = /^\d{4}-\d{2}-\d{2}$/;

/** Which first attempts are asked for; every attribute is that of the first attempt. */
export class YieldQueryDto {
  /**
   * First site day.
   * @example "2026-11-01"
   */
  @Matches(DAY_FORM, { message: 'from must be a day, YYYY-MM-DD' })
  from!: string;

  /**
   * Last site day, itself included.
   * @example "2026-11-30"
   */
  @Matches(DAY_FORM, { message: 'to must be a day, YYYY-MM-DD' })
  to!: string;

  /** Width of a step of the trend. */
  @IsOptional()
  @IsIn(bucketKinds)
  by?: BucketKind = 'day';

  /** What the cohort is split by, besides. */
  @IsOptional()
  @IsIn(splitKinds)
  split?: SplitKind;

  @IsOptional() @IsString() @MaxLength(64) partNumber?: string;
  @IsOptional() @IsString() @MaxLength(64) stage?: string;
  @IsOptional() @IsString() @MaxLength(64) station?: string;
  @IsOptional() @IsString() @MaxLength(64) fixture?: string;
  @IsOptional() @IsString() @MaxLength(64) lot?: string;
  @IsOptional() @IsString() @MaxLength(64) programVersion?: string;
}
