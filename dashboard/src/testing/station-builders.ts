import type { ApiKey, CreatedApiKey, Instrument } from '@/types/api';

export function anInstrument(overrides: Partial<Instrument> = {}): Instrument {
  return {
    kind: 'ammeter',
    serialNumber: 'AM-0031',
    model: 'bench ammeter',
    resolution: 1e-8,
    readingAccuracyPercent: 0.02,
    rangeAccuracyPercent: 0.005,
    calibrationDueOn: '2027-03-31',
    calibrationOverdue: false,
    ...overrides,
  };
}

export function aKey(overrides: Partial<ApiKey> = {}): ApiKey {
  return {
    keyId: 3,
    prefix: 'k7m2p9qx',
    label: 'rack PC, bay 2',
    practice: false,
    state: 'active',
    createdAt: '2026-11-02T09:00:00.000Z',
    createdBy: 'mara@fernhollow.example',
    expiresAt: null,
    revokedAt: null,
    lastUsedAt: '2026-11-30T08:15:42.000Z',
    ...overrides,
  };
}

export function aCreatedKey(overrides: Partial<CreatedApiKey> = {}): CreatedApiKey {
  return { ...aKey(), key: 'amk_k7m2p9qx_0123456789abcdefghijklmnopqrstuvwxyzABCDEFG', ...overrides };
}
