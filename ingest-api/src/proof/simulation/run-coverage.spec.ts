import { coverageLines } from './coverage-lines.js';
import { ShortfallFinder } from './coverage-shortfalls.js';
import { runCoverage } from './run-coverage.js';
import { seededRandom } from './seeded-random.js';

describe('seededRandom', () => {
  it('repeats its numbers from the seed and fills the interval and the bell', () => {
    const random = seededRandom(42);
    const again = seededRandom(42);
    expect(seededRandom(43).uniform()).not.toBe(seededRandom(42).uniform());
    const uniform = Array.from({ length: 4000 }, () => random.uniform());
    expect(Array.from({ length: 4000 }, () => again.uniform())).toEqual(uniform);
    expect(uniform.every((value) => value >= 0 && value < 1)).toBe(true);
    expect(mean(uniform)).toBeCloseTo(0.5, 1);
    const normal = Array.from({ length: 4000 }, () => random.normal());
    expect(mean(normal)).toBeCloseTo(0, 1);
    expect(mean(normal.map((value) => value * value))).toBeCloseTo(1, 1);
  });
});

describe('runCoverage', () => {
  const report = runCoverage({ draws: 300, drawsEach: 40, seed: 20261201 });

  it('meets every aim in its short form', () => {
    expect(report.shortfalls).toEqual([]);
    expect(report.benches).toHaveLength(21);
  });

  it('repeats from its seed', () => {
    const small = { draws: 10, seed: 5 };
    expect(runCoverage(small)).toEqual(runCoverage(small));
  });

  it('prints a line a bench and says that nothing falls short', () => {
    const lines = coverageLines(report);
    expect(lines.filter((line) => /^(5|12|40) /.test(line) && line.includes(' at '))).toHaveLength(21);
    expect(lines.at(-1)).toBe('No figure falls short.');
    expect(lines.at(-3)).toMatch(/^A short run/);
  });

  it('holds a whole run to the aims as they stand, and gives a short one the room its draws need', () => {
    const bench = { pointCount: 5, noise: 0 };
    const worst = { slope: 1, covered: 0.88, draws: 100 };
    expect(new ShortfallFinder(0).atSlope(bench, worst)).toHaveLength(1);
    expect(new ShortfallFinder(3).atSlope(bench, worst)).toHaveLength(0);
    expect(new ShortfallFinder(3).atSlope(bench, { ...worst, covered: 0.8 })).toHaveLength(1);
  });

  it('names what falls short', () => {
    const cell = { ...report.benches[0]!.cells[0]!, covered: 0.8, relativeWidth: 5 };
    const shortfalls = new ShortfallFinder(0).inCell(cell);
    expect(shortfalls.map(({ aim }) => aim)).toEqual(['≥ 93 %', '≤ 2.2']);
    expect(coverageLines({ ...report, shortfalls }).at(-1)).toMatch(/^FALLS SHORT {2}width, 5 points/);
  });
});

function mean(values: readonly number[]): number {
  return values.reduce((sum, value) => sum + value, 0) / values.length;
}
