import type { AuditEntry, Proof, ProofRow, Right } from '@/types/api';

export function aRight(overrides: Partial<Right> = {}): Right {
  return {
    method: 'POST',
    path: '/api/v1/stations',
    summary: 'Add a station',
    access: 'roles',
    roles: ['integrator', 'administrator'],
    ...overrides,
  };
}

export function anAuditEntry(overrides: Partial<AuditEntry> = {}): AuditEntry {
  return {
    auditId: 12,
    at: '2026-11-30T09:00:00.000Z',
    actor: 'mara@fernhollow.example',
    action: 'apiKey.revoked',
    subject: 'north-1 k7m2p9qx',
    detail: null,
    ...overrides,
  };
}

export function aProofRow(overrides: Partial<ProofRow> = {}): ProofRow {
  return {
    caseId: 'reg-nist-norris',
    title: 'StRD linear regression: Norris',
    source: 'NIST Statistical Reference Datasets',
    status: 'source read',
    quantity: 'estimate.B1',
    published: '1.00211681802045',
    computed: '1.00211681802045',
    agreeingDigits: 15,
    requiredDigits: 11,
    ok: true,
    ...overrides,
  };
}

export function aProof(rows: ProofRow[] = [aProofRow()]): Proof {
  const passed = rows.filter(({ ok }) => ok).length;
  return {
    computedAt: '2026-11-30T12:00:00.000Z',
    version: '0.1.0',
    passed,
    failed: rows.length - passed,
    rows,
  };
}
