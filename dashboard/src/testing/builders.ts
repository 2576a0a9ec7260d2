import type {
  Breach,
  ResultDetail,
  RunItem,
  Session,
  Site,
  SlopeFigures,
  Station,
  Today,
  TodayProduct,
  TodayStage,
  Unit,
  UnitItem,
  User,
  Yield,
} from '@/types/api';
import { aMeasure, aSweep } from './sweep-builders';

export function aSite(overrides: Partial<Site> = {}): Site {
  return {
    name: 'Fernhollow Controls',
    timeZone: 'UTC',
    demo: false,
    localMailbox: false,
    version: '0.1.0',
    demoAccounts: [],
    ...overrides,
  };
}

export function aUser(overrides: Partial<User> = {}): User {
  return {
    userId: 1,
    email: 'lead@fernhollow.example',
    displayName: 'Ines Calder',
    role: 'qualityLead',
    active: true,
    createdAt: '2026-11-01T08:00:00.000Z',
    lastSignInAt: '2026-11-30T06:00:00.000Z',
    ...overrides,
  };
}

export function aSession(overrides: Partial<User> = {}): Session {
  return { user: aUser(overrides) };
}

export function aSlope(overrides: Partial<SlopeFigures> = {}): SlopeFigures {
  return {
    conductanceSiemens: 8.24e-8,
    expandedUncertaintySiemens: 2e-9,
    limitSiemens: 1e-7,
    impedanceOhms: 12.14e6,
    impedanceBound: 'exact',
    referenceAmps: 0.0005014,
    ...overrides,
  };
}

export function aRun(overrides: Partial<RunItem> = {}): RunItem {
  return {
    resultId: '0193f3a2-6f0e-7c52-9a3e-5b1f4c0d2e11',
    receivedAt: '2026-11-30T08:15:42.100Z',
    startedAt: '2026-11-30T08:15:30.120Z',
    partNumber: 'FH-R500-W',
    serialNumber: 'W26480417',
    lot: 'L2648-2',
    stage: 'final',
    station: 'north-1',
    attempt: 1,
    verdict: 'pass',
    runKind: 'production',
    outcome: 'completed',
    slope: aSlope(),
    failedMeasures: [],
    flags: [],
    ...overrides,
  };
}

export function aResult(overrides: Partial<ResultDetail> = {}): ResultDetail {
  return {
    ...aRun(),
    finishedAt: '2026-11-30T08:15:41.900Z',
    sentAt: '2026-11-30T08:15:42.010Z',
    operator: 'B117',
    fixture: '2',
    channel: '1',
    programName: 'fh-final',
    programVersion: '3.4.1',
    ambientCelsius: 23.4,
    supplyVolts: 9.004,
    abortReason: null,
    stationVerdict: 'pass',
    routedOn: 'hub',
    notes: null,
    testPlanVersion: 3,
    limitSetVersion: 2,
    disposition: 'next',
    nextStage: null,
    attemptsLeft: 2,
    measures: [aMeasure()],
    sweep: aSweep(),
    flagTexts: [],
    warnings: [],
    ...overrides,
  };
}

export function aYield(overrides: Partial<Yield> = {}): Yield {
  return { passed: 96, total: 100, share: 0.96, low: 0.9016, high: 0.9843, ...overrides };
}

export function aTodayStage(overrides: Partial<TodayStage> = {}): TodayStage {
  return {
    stage: 'final',
    target: 0.95,
    firstPass: aYield(),
    final: aYield({ passed: 98, share: 0.98 }),
    failed: 3,
    notProven: 1,
    openUnits: 1,
    previous: aYield({ passed: 680, total: 700, share: 0.9714, low: 0.9563, high: 0.9814 }),
    ...overrides,
  };
}

export function aTodayProduct(overrides: Partial<TodayProduct> = {}): TodayProduct {
  return {
    partNumber: 'FH-R500-W',
    description: 'Excitation module 500 µA, Wilson mirror, 9 V',
    stages: [aTodayStage({ stage: 'board' }), aTodayStage()],
    rolledThroughput: aYield({ share: 0.9216, low: 0.861, high: 0.956 }),
    ...overrides,
  };
}

export function aBreach(overrides: Partial<Breach> = {}): Breach {
  return {
    breachId: 1,
    title: 'FH-R500-W final: output impedance below its limit',
    partNumber: 'FH-R500-W',
    stage: 'final',
    measure: 'outputImpedance',
    state: 'open',
    openedAt: '2026-11-30T07:50:00.000Z',
    lastEventAt: '2026-11-30T08:10:00.000Z',
    eventCount: 3,
    acknowledgedAt: null,
    acknowledgedBy: null,
    note: null,
    closedAt: null,
    closedBy: null,
    cause: null,
    action: null,
    latest: aRun({ verdict: 'fail', serialNumber: 'W26480399', failedMeasures: ['outputImpedance'] }),
    ...overrides,
  };
}

export function aToday(overrides: Partial<Today> = {}): Today {
  return {
    date: '2026-11-30',
    timeZone: 'UTC',
    products: [aTodayProduct()],
    worse: [],
    openBreaches: [],
    recent: [aRun()],
    ...overrides,
  };
}

export function aStation(overrides: Partial<Station> = {}): Station {
  return {
    station: 'north-1',
    line: 'north',
    active: true,
    state: 'posting',
    lastPostAt: '2026-11-30T08:15:42.100Z',
    lastHeartbeatAt: null,
    latest: aRun(),
    postsToday: 212,
    refusedToday: 0,
    clockSkewSeconds: 0.1,
    goldenDueAt: null,
    instruments: [],
    ...overrides,
  };
}

export function aUnitItem(overrides: Partial<UnitItem> = {}): UnitItem {
  return {
    partNumber: 'FH-R500-W',
    serialNumber: 'W26480417',
    lot: 'L2648-2',
    lastTestedAt: '2026-11-30T08:15:30.120Z',
    latest: aRun(),
    asked: aRun(),
    stages: [
      { stage: 'board', attempts: 1, verdict: 'pass' },
      { stage: 'final', attempts: 1, verdict: 'pass' },
    ],
    ...overrides,
  };
}

export function aUnit(overrides: Partial<Unit> = {}): Unit {
  return {
    partNumber: 'FH-R500-W',
    serialNumber: 'W26480417',
    lot: 'L2648-2',
    description: 'Excitation module 500 µA, Wilson mirror, 9 V',
    caution: null,
    stages: [{ stage: 'final', maxAttempts: 3, verdict: 'pass', results: [aRun()] }],
    ...overrides,
  };
}
