import { createHash } from 'node:crypto';
import { uniformFloat64 } from 'pure-rand/distribution/uniformFloat64';
import { uniformInt } from 'pure-rand/distribution/uniformInt';
import { xoroshiro128plusFromState } from 'pure-rand/generator/xoroshiro128plus';

/** A seeded source of random numbers; drawing from it moves it on. */
export interface RandomSource {
  /** Uniform in [0, 1). */
  uniform(): number;
  /** Uniform in [low, high). */
  between(low: number, high: number): number;
  /** Whole number, both ends included. */
  integer(low: number, high: number): number;
  /** True with the given probability (0 to 1). */
  chance(probability: number): boolean;
  normal(mean: number, standardDeviation: number): number;
  pick<T>(items: readonly [T, ...T[]]): T;
  /** A source of its own, fixed by this source's seed and the label, however much was drawn here before. */
  fork(label: string): RandomSource;
}

/** Same seed, same numbers, on every machine. */
export function createRandom(seed: string | number): RandomSource {
  const seedText = String(seed);
  const digest = createHash('sha256').update(seedText).digest();
  const generator = xoroshiro128plusFromState([0, 4, 8, 12].map((offset) => digest.readInt32LE(offset)));
  const uniform = () => uniformFloat64(generator);
  return {
    uniform,
    between: (low, high) => low + (high - low) * uniform(),
    integer: (low, high) => uniformInt(generator, low, high),
    chance: (probability) => uniform() < probability,
    normal: (mean, standardDeviation) => mean + standardDeviation * standardNormal(uniform),
    pick: (items) => items[uniformInt(generator, 0, items.length - 1)] ?? items[0],
    fork: (label) => createRandom(`${seedText}/${label}`),
  };
}

/** Box–Muller transform (textbook formula, from memory); 1 − u keeps the logarithm finite. */
function standardNormal(uniform: () => number): number {
  return Math.sqrt(-2 * Math.log(1 - uniform())) * Math.cos(2 * Math.PI * uniform());
}
