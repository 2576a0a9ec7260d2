import { IsIn, IsOptional, IsString, MaxLength } from 'class-validator';
import { PageQueryDto } from '../../common/page-query.dto.js';

export const verdicts = ['pass', 'fail', 'notProven', 'unjudged', 'aborted'] as const;
const runKinds = ['production', 'golden', 'study', 'practice'] as const;

export class ResultQueryDto extends PageQueryDto {
  @IsOptional() @IsString() @MaxLength(64) partNumber?: string;
  @IsOptional() @IsString() @MaxLength(64) serialNumber?: string;
  @IsOptional() @IsString() @MaxLength(64) stage?: string;
  @IsOptional() @IsString() @MaxLength(64) station?: string;
  @IsOptional() @IsString() @MaxLength(64) lot?: string;
  @IsOptional() @IsIn(verdicts) verdict?: (typeof verdicts)[number];
  @IsOptional() @IsIn(runKinds) runKind?: (typeof runKinds)[number];
}
