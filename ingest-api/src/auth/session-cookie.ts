import { Inject, Injectable } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';
import type { Request, Response } from 'express';
import { CLOCK, type Clock, ENV } from '../config/config.module.js';
import type { Env } from '../config/env.js';

export const SESSION_COOKIE = 'ampkeep_session';

interface SessionClaims {
  jti?: unknown;
}

/** Carries the session's id in a signed token, in a cookie that scripts can't read. */
@Injectable()
export class SessionCookie {
  constructor(
    private readonly jwt: JwtService,
    @Inject(ENV) private readonly env: Env,
    @Inject(CLOCK) private readonly clock: Clock,
  ) {}

  async write(response: Response, session: { sessionId: string; expiresAt: number }): Promise<void> {
    const token = await this.jwt.signAsync({
      jti: session.sessionId,
      iat: Math.floor(this.clock() / 1000),
      exp: Math.floor(session.expiresAt / 1000),
    });
    response.cookie(SESSION_COOKIE, token, {
      ...this.attributes(),
      maxAge: session.expiresAt - this.clock(),
    });
  }

  clear(response: Response): void {
    response.clearCookie(SESSION_COOKIE, this.attributes());
  }

  /** The session's id, or null when the request carries no token or one that we did not sign. */
  async read(request: Request): Promise<string | null> {
    const token = (request.cookies as Record<string, unknown> | undefined)?.[SESSION_COOKIE];
    if (typeof token !== 'string') return null;
    try {
      const claims = await this.jwt.verifyAsync<SessionClaims>(token, {
        clockTimestamp: Math.floor(this.clock() / 1000),
      });
      return typeof claims.jti === 'string' ? claims.jti : null;
    } catch {
      return null;
    }
  }

  /** Lax, not Strict: a link in a mail must open the page for someone who is signed in. */
  private attributes() {
    return {
      httpOnly: true,
      sameSite: 'lax',
      secure: this.env.publicUrl.startsWith('https:'),
      path: '/',
    } as const;
  }
}
