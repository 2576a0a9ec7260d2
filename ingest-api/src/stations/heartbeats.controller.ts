import { Body, Controller, HttpCode, Post } from '@nestjs/common';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { CurrentStation } from '../auth/principal.decorators.js';
import type { StationPrincipal } from '../auth/principals.js';
import { ApiProblems } from '../common/api-problems.decorator.js';
import { HeartbeatDto, PostHeartbeatDto } from './dto/heartbeat.dto.js';
import { HeartbeatsService } from './heartbeats.service.js';

@ApiTags('for stations')
@Controller('heartbeats')
export class HeartbeatsController {
  constructor(private readonly heartbeats: HeartbeatsService) {}

  @Post()
  @HttpCode(200)
  @ApiOperation({ summary: "Say that the station lives; the answer is the server's time" })
  @ApiProblems(400, 422)
  beat(@Body() { sentAt }: PostHeartbeatDto, @CurrentStation() station: StationPrincipal): HeartbeatDto {
    const { at, clockSkewMs } = this.heartbeats.beat(
      station.stationId,
      sentAt === undefined ? null : Date.parse(sentAt),
    );
    return {
      serverTime: new Date(at).toISOString(),
      clockSkewSeconds: clockSkewMs === null ? null : Math.round(clockSkewMs / 1000),
    };
  }
}
