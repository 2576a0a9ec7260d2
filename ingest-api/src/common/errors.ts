/** One thing wrong at one place of what was sent; `pointer` is a JSON Pointer (RFC 6901), `''` the whole. */
export interface ErrorPlace {
  pointer: string;
  code: string;
  detail: string;
}

/**
 * Base of everything a service may throw at a caller. Only the problem filter turns it into HTTP.
 * The message says what is wrong, where, and what to do.
 */
export class AmpkeepError extends Error {
  constructor(
    readonly status: number,
    readonly code: string,
    readonly title: string,
    detail: string,
    readonly errors: readonly ErrorPlace[] = [],
    readonly retryAfterSeconds: number | null = null,
  ) {
    super(detail);
    this.name = new.target.name;
  }
}

export class MalformedError extends AmpkeepError {
  constructor(detail: string, errors: readonly ErrorPlace[] = []) {
    super(400, 'malformed', 'The request could not be read', detail, errors);
  }
}

export class NotSignedInError extends AmpkeepError {
  constructor(detail = 'Sign in first.') {
    super(401, 'not_signed_in', 'Not signed in', detail);
  }
}

export class KeyRequiredError extends AmpkeepError {
  constructor(detail = 'Send your API key in the header X-API-Key. Keys are made on the Stations page.') {
    super(401, 'key_unknown', 'No or unknown API key', detail);
  }
}

export class ForbiddenError extends AmpkeepError {
  constructor(code: string, detail: string) {
    super(403, code, 'Not allowed', detail);
  }
}

export class NotFoundError extends AmpkeepError {
  constructor(what: string) {
    super(404, 'not_found', 'Not found', `${what} doesn't exist here.`);
  }
}

export class ConflictError extends AmpkeepError {
  constructor(code: string, detail: string, errors: readonly ErrorPlace[] = []) {
    super(409, code, 'In conflict with what is stored', detail, errors);
  }
}

export class InvalidError extends AmpkeepError {
  constructor(errors: readonly ErrorPlace[], detail?: string) {
    super(
      422,
      'invalid',
      'The content is not valid',
      detail ?? `${errors.length} place(s) need mending; see errors.`,
      errors,
    );
  }
}

export class TooManyRequestsError extends AmpkeepError {
  constructor(detail: string, retryAfterSeconds: number) {
    super(429, 'too_many_requests', 'Too many requests', detail, [], retryAfterSeconds);
  }
}

/** It can't be stored now; nothing was stored; ask again. */
export class StoreUnavailableError extends AmpkeepError {
  constructor(retryAfterSeconds: number) {
    super(
      503,
      'store_unavailable',
      'Cannot be stored now',
      'Nothing was stored. Keep it and send it again after the pause.',
      [],
      retryAfterSeconds,
    );
  }
}
