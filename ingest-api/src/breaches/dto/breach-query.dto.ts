import { IsIn, IsOptional } from 'class-validator';
import { PageQueryDto } from '../../common/page-query.dto.js';
import { type BreachState, breachStates } from '../models/breach.model.js';

const wantedStates = [...breachStates, 'all'] as const;

export class BreachQueryDto extends PageQueryDto {
  /** Left out: all. */
  @IsOptional()
  @IsIn(wantedStates)
  state?: BreachState | 'all';
}
