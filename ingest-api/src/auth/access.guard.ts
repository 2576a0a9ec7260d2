import { type CanActivate, type ExecutionContext, Inject, Injectable } from '@nestjs/common';
import { ForbiddenError, NotSignedInError } from '../common/errors.js';
import { ENV } from '../config/config.module.js';
import type { Env } from '../config/env.js';
import { SessionsService } from '../users/sessions.service.js';
import type { AmpkeepRequest, Person } from './principals.js';
import { type Access, rights } from './rights.js';
import { requireSameOrigin } from './same-origin.js';
import { SessionCookie } from './session-cookie.js';
import { StationKeyGuard } from './station-key.guard.js';

const allRights = new Map<string, Access>(Object.entries(rights));

/** Entry of the table of rights for the route that express matched; a HEAD is answered by its GET. */
function accessOf(request: AmpkeepRequest): Access | undefined {
  const method = request.method === 'HEAD' ? 'GET' : request.method;
  return allRights.get(`${method} ${(request.route as { path: string }).path}`);
}

/** Stands before every route and lets through whom the table of rights lets through, nobody else. */
@Injectable()
export class AccessGuard implements CanActivate {
  constructor(
    private readonly sessions: SessionsService,
    private readonly cookie: SessionCookie,
    private readonly stationKey: StationKeyGuard,
    @Inject(ENV) private readonly env: Env,
  ) {}

  async canActivate(context: ExecutionContext): Promise<boolean> {
    const request = context.switchToHttp().getRequest<AmpkeepRequest>();
    const access = accessOf(request);
    if (access === undefined) {
      throw new ForbiddenError('forbidden', 'Nobody may use this route: the table of rights lacks it.');
    }
    if (access.station && (!access.roles || request.headers['x-api-key'] !== undefined)) {
      return (await this.stationKey.canActivate(context)) as boolean;
    }
    requireSameOrigin(request, this.env.publicUrl);
    if (!access.public) request.person = await this.signedInPerson(request, access);
    return true;
  }

  private async signedInPerson(request: AmpkeepRequest, access: Access): Promise<Person> {
    const sessionId = await this.cookie.read(request);
    const person = sessionId === null ? null : await this.sessions.find(sessionId);
    if (person === null) throw new NotSignedInError();
    const allowed = access.roles ?? [];
    if (!allowed.includes(person.role)) {
      throw new ForbiddenError(
        'role_not_allowed',
        `Your role is ${person.role}; this is for ${allowed.join(', ')}. An administrator can change roles.`,
      );
    }
    return person;
  }
}
