import { Controller, type MessageEvent, Sse } from '@nestjs/common';
import { ApiOkResponse, ApiOperation, ApiProduces, ApiTags } from '@nestjs/swagger';
import type { Observable } from 'rxjs';
import { CurrentPerson } from '../auth/principal.decorators.js';
import type { Person } from '../auth/principals.js';
import { ApiProblems } from '../common/api-problems.decorator.js';
import { SessionsService } from '../users/sessions.service.js';
import { LiveEventDto } from './dto/live-event.dto.js';
import { liveStream } from './live-stream.js';
import { LiveService } from './live.service.js';

@ApiTags('line')
@Controller('live')
export class LiveController {
  constructor(
    private readonly live: LiveService,
    private readonly sessions: SessionsService,
  ) {}

  @ApiOperation({
    summary: 'Follow changes as they happen',
    description:
      'Server-sent events. Each event says what changed; an event named `ping` comes every 15 seconds. ' +
      'The stream ends when the session ends.',
  })
  @ApiProduces('text/event-stream')
  @ApiProblems()
  @ApiOkResponse({ type: LiveEventDto, description: 'The `data` of each event.' })
  @Sse()
  follow(@CurrentPerson() person: Person): Observable<MessageEvent> {
    return liveStream(this.live.events, async () => (await this.sessions.find(person.sessionId)) !== null);
  }
}
