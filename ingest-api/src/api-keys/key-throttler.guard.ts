import { type ExecutionContext, Injectable } from '@nestjs/common';
import { ThrottlerGuard } from '@nestjs/throttler';
import type { AmpkeepRequest } from '../auth/principals.js';

/** Counts posts by API key; people and public routes are not throttled here (sign-in has its own). */
@Injectable()
export class KeyThrottlerGuard extends ThrottlerGuard {
  protected override shouldSkip(context: ExecutionContext): Promise<boolean> {
    return Promise.resolve(
      context.switchToHttp().getRequest<AmpkeepRequest>().stationPrincipal === undefined,
    );
  }

  protected override getTracker(request: Record<string, unknown>): Promise<string> {
    return Promise.resolve(`key ${(request as unknown as AmpkeepRequest).stationPrincipal?.apiKeyId}`);
  }

  protected override getErrorMessage(): Promise<string> {
    return Promise.resolve('This key sends more than its share. Wait as Retry-After says, then send again.');
  }
}
