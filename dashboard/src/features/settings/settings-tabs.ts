import { paths } from '@/config/paths';
import type { Role } from '@/types/api';

export interface SettingsTab {
  label: string;
  to: string;
  /** Left out: for everybody. */
  roles?: readonly Role[];
}

export const seesAccounts: readonly Role[] = ['administrator'];
export const seesAudit: readonly Role[] = ['qualityLead', 'administrator'];
export const seesProof: readonly Role[] = ['productionEngineer', 'qualityLead', 'administrator'];

/** The sides of Settings. The server decides who sees what; this only spares people doors that stay shut. */
export const settingsTabs: readonly SettingsTab[] = [
  { label: 'Your account', to: paths.settings() },
  { label: 'Accounts', to: paths.accounts(), roles: seesAccounts },
  { label: 'Rights', to: paths.rights() },
  { label: 'Audit trail', to: paths.audit(), roles: seesAudit },
  { label: 'Proof', to: paths.proof(), roles: seesProof },
];
