const words: Record<string, string> = {
  'session.started': 'signed in',
  'session.ended': 'signed out',
  'account.created': 'added the account',
  'account.changed': 'changed the account',
  'account.passwordChanged': 'changed the own password',
  'apiKey.created': 'made an API key',
  'apiKey.revoked': 'revoked an API key',
  'station.created': 'added the station',
  'product.created': 'added the product',
  'breach.acknowledged': 'acknowledged',
  'breach.closed': 'closed',
};

/** What somebody did, in words; an unknown deed as the trail has it. */
export const deedInWords = (action: string): string => words[action] ?? action;
