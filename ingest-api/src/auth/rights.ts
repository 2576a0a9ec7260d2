import { type Role, roles } from './roles.js';

/** Who may use a route. A route without an entry is refused and fails a test. */
export interface Access {
  /** Anyone, signed in or not. */
  public?: true;
  /** A station with an API key. */
  station?: true;
  /** People of these roles. */
  roles?: readonly Role[];
}

const anyone: Access = { public: true };
const station: Access = { station: true };
const signedIn: Access = { roles };
const only = (...allowed: Role[]): Access => ({ roles: allowed });

/** Roles × routes: the one table, shown in Settings, tested route by route. */
export const rights: Readonly<Record<string, Access>> = {
  'GET /api/v1/health': anyone,
  'GET /api/v1/site': anyone,
  'POST /api/v1/session': anyone,
  'GET /api/v1/session': signedIn,
  'DELETE /api/v1/session': signedIn,
  'POST /api/v1/session/password': signedIn,
  'GET /api/v1/users': only('administrator'),
  'POST /api/v1/users': only('administrator'),
  'PATCH /api/v1/users/:userId': only('administrator'),
  'GET /api/v1/rights': signedIn,
  'GET /api/v1/audit': only('administrator', 'qualityLead'),

  'POST /api/v1/results': station,
  'GET /api/v1/results': signedIn,
  'GET /api/v1/results/:resultId': { station: true, roles },
  'GET /api/v1/results/:resultId/post': signedIn,
  'GET /api/v1/units': signedIn,
  'GET /api/v1/units/:partNumber/:serialNumber': signedIn,
  'GET /api/v1/units/:partNumber/:serialNumber/route': { station: true, roles },
  'POST /api/v1/heartbeats': station,
  'GET /api/v1/test-plans/current': { station: true, roles },
  'GET /api/v1/today': signedIn,
  'GET /api/v1/yields': signedIn,
  'GET /api/v1/products': signedIn,

  'GET /api/v1/stations': signedIn,
  'POST /api/v1/stations': only('integrator', 'administrator'),
  'GET /api/v1/stations/:station/keys': only(
    'productionEngineer',
    'qualityLead',
    'integrator',
    'administrator',
  ),
  'POST /api/v1/stations/:station/keys': only('integrator', 'administrator'),
  'POST /api/v1/stations/:station/keys/:keyId/revoke': only('integrator', 'administrator'),
  'GET /api/v1/intake': signedIn,
  'GET /api/v1/intake/refused/:intakeId': signedIn,

  'GET /api/v1/breaches': signedIn,
  'GET /api/v1/breaches/:breachId': signedIn,
  'POST /api/v1/breaches/:breachId/acknowledge': only('productionEngineer', 'qualityLead'),
  'POST /api/v1/breaches/:breachId/close': only('qualityLead'),
  'GET /api/v1/mailbox': signedIn,
  'GET /api/v1/mailbox/:mailId': signedIn,
  'GET /api/v1/live': signedIn,
  'GET /api/v1/proof': only('qualityLead', 'productionEngineer', 'administrator'),
};
