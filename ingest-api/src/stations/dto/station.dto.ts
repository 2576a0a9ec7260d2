import { Matches, MaxLength } from 'class-validator';
import { RunItemDto } from '../../results/dto/run-item.dto.js';

export class InstrumentDto {
  kind!: 'ammeter' | 'voltmeter';
  serialNumber!: string;
  model!: string | null;
  /** A or V, by kind. */
  resolution!: number | null;
  readingAccuracyPercent!: number | null;
  rangeAccuracyPercent!: number | null;
  /** @example "2027-03-31" */
  calibrationDueOn!: string | null;
  calibrationOverdue!: boolean;
}

export class StationDto {
  /** @example "north-2" */
  station!: string;
  line!: string;
  active!: boolean;
  /** `posting`: within the last ten minutes. */
  state!: 'posting' | 'quiet' | 'neverPosted';
  lastPostAt!: string | null;
  lastHeartbeatAt!: string | null;
  latest!: RunItemDto | null;
  postsToday!: number;
  refusedToday!: number;
  clockSkewSeconds!: number | null;
  /** When the next golden check is owed; null when none is asked for or none was made yet. */
  goldenDueAt!: string | null;
  instruments!: InstrumentDto[];
}

export class CreateStationDto {
  /**
   * Short name; never changes.
   * @example "south-3"
   */
  @Matches(/^[a-z0-9][a-z0-9-]{0,39}$/, {
    message: 'station must be lower-case letters, digits and hyphens, 40 at most',
  })
  station!: string;

  /** @example "south" */
  @MaxLength(40)
  @Matches(/^\S(.*\S)?$/, { message: 'line must not be empty nor begin or end with a space' })
  line!: string;
}
