/** Every address inside the dashboard. */
export const paths = {
  today: () => '/',
  signIn: (from?: string) =>
    from && from !== '/' ? `/sign-in?from=${encodeURIComponent(from)}` : '/sign-in',
  units: (query: Record<string, string> = {}) => withQuery('/units', query),
  unit: (partNumber: string, serialNumber: string, resultId?: string) =>
    withQuery(
      `/units/${encodeURIComponent(partNumber)}/${encodeURIComponent(serialNumber)}`,
      resultId ? { result: resultId } : {},
    ),
  yields: (query: Record<string, string> = {}) => withQuery('/yield', query),
  limits: () => '/limits',
  stations: () => '/stations',
  station: (station: string) => `/stations/${encodeURIComponent(station)}`,
  breaches: (query: Record<string, string> = {}) => withQuery('/breaches', query),
  breach: (breachId: number) => `/breaches/${breachId}`,
  intake: (query: Record<string, string> = {}) => withQuery('/intake', query),
  refusedPost: (intakeId: string) => `/intake/refused/${encodeURIComponent(intakeId)}`,
  connect: () => '/connect',
  settings: () => '/settings',
  accounts: () => '/settings/accounts',
  rights: () => '/settings/rights',
  audit: () => '/settings/audit',
  proof: () => '/settings/proof',
  mailbox: (query: Record<string, string> = {}) => withQuery('/mailbox', query),
};

function withQuery(path: string, query: Record<string, string>): string {
  const search = new URLSearchParams(query).toString();
  return search ? `${path}?${search}` : path;
}
