import { $api } from './api-client';

/** All stations; used by the line strip, by filters and by the stations' own page. */
export const stationsOptions = () => $api.queryOptions('get', '/api/v1/stations');
