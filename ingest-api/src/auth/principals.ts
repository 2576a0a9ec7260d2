import type { Request } from 'express';
import type { Role } from './roles.js';

/** A signed-in person, as every handler sees them. */
export interface Person {
  userId: number;
  email: string;
  displayName: string;
  role: Role;
  sessionId: string;
}

/** A station that showed a valid key. */
export interface StationPrincipal {
  stationId: number;
  station: string;
  apiKeyId: number;
  /** A practice key's results are judged and shown, never counted. */
  practice: boolean;
}

/** What the access guard leaves on the request: exactly one of both, none on public routes. */
export interface AmpkeepRequest extends Request {
  person?: Person;
  stationPrincipal?: StationPrincipal;
}
