import { type LiveTopic, liveTopics } from '../live.service.js';
import { ApiProperty } from '@nestjs/swagger';

/** Says that something of this topic changed; ask again for what you show. */
export class LiveEventDto {
  @ApiProperty({ enum: liveTopics, enumName: 'LiveTopic' })
  topic!: LiveTopic;

  /** What changed, where one thing can be named. */
  @ApiProperty({ type: String, nullable: true })
  id!: string | null;
}
