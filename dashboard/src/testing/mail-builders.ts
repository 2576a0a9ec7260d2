import type { MailboxItem, MailboxMail } from '@/types/api';

export function aMailItem(overrides: Partial<MailboxItem> = {}): MailboxItem {
  return {
    mailId: '1796025342010-9f86d081884c',
    to: ['lead@fernhollow.example'],
    from: '"Ampkeep" <ampkeep@localhost>',
    subject: 'FH-R500-W at final: output impedance 7.2 MΩ, at least 10 MΩ required',
    receivedAt: '2026-11-30T07:50:01.000Z',
    messageId: '<breach-1@localhost>',
    ...overrides,
  };
}

export function aMail(overrides: Partial<MailboxMail> = {}): MailboxMail {
  return {
    ...aMailItem(),
    text: 'Output impedance out of limits.\n\nOpen the breach: http://localhost:4780/breaches/1\n',
    html: '<!doctype html><html><head><title>Breach</title></head><body><a href="http://localhost:4780/breaches/1">Open the breach</a></body></html>',
    ...overrides,
  };
}
