/** The five roles of people; stations are no role, they hold API keys. */
export const roles = ['viewer', 'productionEngineer', 'qualityLead', 'integrator', 'administrator'] as const;
export type Role = (typeof roles)[number];
