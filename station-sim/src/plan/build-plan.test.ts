import { describe, expect, it } from 'vitest';
import { createRandom } from '../circuit/random.js';
import { buildPlan, type PlanOptions, type PlannedTest } from './build-plan.js';

const planOf = (seed: number, count: number, overrides: Partial<PlanOptions> = {}): PlannedTest[] => {
  const options = { scenario: 'steady', stations: 3, madeAt: new Date('2026-11-26'), ...overrides } as const;
  const tests: PlannedTest[] = [];
  for (const test of buildPlan(options, createRandom(seed))) {
    if (tests.push(test) === count) break;
  }
  return tests;
};

describe('a steady plan', () => {
  it('is the same for the same seed', () => {
    expect(planOf(42, 50)).toEqual(planOf(42, 50));
  });

  it('tests other units for another seed', () => {
    const serials = new Set(planOf(42, 50).map((test) => test.unit.serialNumber));
    const others = planOf(43, 50).filter((test) => test.runKind === 'production');
    expect(others.some((test) => serials.has(test.unit.serialNumber))).toBe(false);
  });

  it('begins every unit on the board stage and takes the stations in turn', () => {
    const tests = planOf(42, 200);
    expect(tests.slice(0, 4).map((test) => test.station)).toEqual([
      'north-1',
      'north-2',
      'north-3',
      'north-1',
    ]);
    for (const test of tests.filter((planned) => planned.runKind === 'production')) {
      expect(test).toMatchObject({ stage: 'board', followed: true });
    }
  });

  it('holds a golden run now and then', () => {
    const golden = planOf(42, 600).filter((test) => test.runKind === 'golden');
    expect(golden.length).toBeGreaterThan(5);
    expect(golden.length).toBeLessThan(50);
    expect(golden[0]?.unit.serialNumber).toMatch(/^GOLD-/);
  });

  it('names units and lots by the week they were made in', () => {
    const wilson = planOf(42, 50).find((test) => test.unit.partNumber === 'FH-R500-W');
    expect(wilson?.unit.serialNumber).toMatch(/^W2648\d+$/);
    expect(wilson?.unit.lot).toBe('L2648-52');
  });
});

describe('the plan for one fail', () => {
  it('holds one leaky unit that is not tested again', () => {
    const tests = planOf(42, 10, { scenario: 'one-fail' });
    expect(tests).toHaveLength(1);
    expect(tests[0]).toMatchObject({ followed: false, unit: { defect: 'leakyTransistor' } });
  });
});
