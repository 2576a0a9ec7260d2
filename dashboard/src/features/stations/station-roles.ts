import type { Role } from '@/types/api';

/** The server decides; these only spare people controls that would be refused. */
export const mayConnectStations: readonly Role[] = ['integrator', 'administrator'];
export const maySeeKeys: readonly Role[] = [
  'productionEngineer',
  'qualityLead',
  'integrator',
  'administrator',
];
