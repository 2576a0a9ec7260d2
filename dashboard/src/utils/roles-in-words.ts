import type { Role } from '@/types/api';

const plurals: Record<Role, string> = {
  viewer: 'viewers',
  productionEngineer: 'production engineers',
  qualityLead: 'quality leads',
  integrator: 'integrators',
  administrator: 'administrators',
};

const list = new Intl.ListFormat('en-GB', { type: 'conjunction' });

/** Who may do something, as the beginning of a sentence: "Integrators and administrators". */
export function rolesInWords(roles: readonly Role[]): string {
  const words = list.format(roles.map((role) => plurals[role]));
  return words.charAt(0).toUpperCase() + words.slice(1);
}
