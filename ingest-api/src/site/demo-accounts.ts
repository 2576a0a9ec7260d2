import type { DemoAccountDto } from './dto/site.dto.js';

/**
 * The demo's accounts. Their passwords are public, so the demo binds to 127.0.0.1 and real use refuses a
 * database that holds them.
 */
export const demoAccounts: readonly DemoAccountDto[] = [
  {
    email: 'quality@fernhollow.example',
    password: 'copper-slope-lead',
    displayName: 'Ines Varga',
    role: 'qualityLead',
  },
  {
    email: 'engineer@fernhollow.example',
    password: 'copper-slope-engineer',
    displayName: 'Tomas Lind',
    role: 'productionEngineer',
  },
  {
    email: 'integrator@fernhollow.example',
    password: 'copper-slope-integrator',
    displayName: 'Mara Osei',
    role: 'integrator',
  },
  {
    email: 'viewer@fernhollow.example',
    password: 'copper-slope-viewer',
    displayName: 'Line display',
    role: 'viewer',
  },
  {
    email: 'admin@fernhollow.example',
    password: 'copper-slope-admin',
    displayName: 'Ruben Castell',
    role: 'administrator',
  },
];
