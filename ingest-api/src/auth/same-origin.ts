import type { Request } from 'express';
import { ForbiddenError } from '../common/errors.js';

const readOnlyMethods = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Refuses a change that a page of another site asked a person's browser for. Browsers say where a request
 * comes from in `Origin`, or in `Sec-Fetch-Site`; one of them must name this site.
 * Hosts are compared, not protocols: behind a proxy that ends TLS the server itself sees plain HTTP.
 * @throws ForbiddenError `origin_not_allowed`
 */
export function requireSameOrigin(request: Request, publicUrl: string): void {
  if (readOnlyMethods.has(request.method)) return;
  const { origin } = request.headers;
  const ownHosts = [new URL(publicUrl).host, request.headers.host];
  const same =
    origin === undefined
      ? request.headers['sec-fetch-site'] === 'same-origin'
      : URL.canParse(origin) && ownHosts.includes(new URL(origin).host);
  if (same) return;
  throw new ForbiddenError(
    'origin_not_allowed',
    `Changes are taken only from pages of ${publicUrl}. A program sends the header "Origin: ${publicUrl}".`,
  );
}
