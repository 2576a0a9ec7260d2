import type { BreachDetail, BreachEvent, OutboxMail } from '@/types/api';
import { aBreach, aRun } from './builders';

export function aBreachEvent(overrides: Partial<BreachEvent> = {}): BreachEvent {
  return {
    at: '2026-11-30T08:10:00.000Z',
    text: 'Output impedance is 7.2 ± 0.1 MΩ; at least 10 MΩ is required, so it fails.',
    run: aRun({ verdict: 'fail', serialNumber: 'W26480399', failedMeasures: ['outputImpedance'] }),
    ...overrides,
  };
}

export function anOutboxMail(overrides: Partial<OutboxMail> = {}): OutboxMail {
  return {
    mailId: 7,
    to: 'lead@fernhollow.example',
    subject: 'FH-R500-W at final: output impedance 7.2 MΩ, at least 10 MΩ required',
    state: 'sent',
    attempts: 1,
    createdAt: '2026-11-30T07:50:00.000Z',
    sentAt: '2026-11-30T07:50:01.000Z',
    lastError: null,
    ...overrides,
  };
}

export function aBreachDetail(overrides: Partial<BreachDetail> = {}): BreachDetail {
  return { ...aBreach(), events: [aBreachEvent()], mails: [anOutboxMail()], ...overrides };
}
