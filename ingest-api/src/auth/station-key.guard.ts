import { Injectable } from '@nestjs/common';
import { AuthGuard, type IAuthModuleOptions } from '@nestjs/passport';
import { KeyRequiredError } from '../common/errors.js';

/** Lets a station in by its API key and leaves it on the request; the key strategy does the checking. */
@Injectable()
export class StationKeyGuard extends AuthGuard('headerapikey') {
  override getAuthenticateOptions(): IAuthModuleOptions {
    return { property: 'stationPrincipal', session: false };
  }

  /** What the strategy throws (revoked, expired) passes through as it is. */
  override handleRequest<Principal>(error: unknown, principal: Principal | false | null): Principal {
    if (error) throw error as Error;
    if (!principal) throw new KeyRequiredError();
    return principal;
  }
}
