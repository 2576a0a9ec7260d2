import { fQuantile } from '../distributions/f.js';
import { univariateSummary } from '../statistics/univariate-summary.js';

export interface DailySeries {
  /** Mean of each day's readings. */
  means: readonly number[];
  /** Standard deviation (n − 1) of each day's readings, same unit as the means. */
  standardDeviations: readonly number[];
  /** Readings a day, the same on every day; at least 2. */
  readingsPerDay: number;
}

export interface RepeatedDays {
  mean: number;
  standardDeviationOfMeans: number;
  /** s_a = √n·s(means): what one reading would scatter by if days explained all. */
  betweenAsReading: number;
  /** s_b: pooled scatter within a day. */
  within: number;
  /** s_a²/s_b². */
  fRatio: number;
  betweenDf: number;
  withinDf: number;
  /** The days' own component, √((s_a² − s_b²)/n); 0 when negative. */
  betweenDays: number;
  /** s(means)/√days: includes both components. */
  uncertaintyOfMean: number;
}

/**
 * Analysis of variance of readings repeated over several days, from the daily means and standard deviations.
 *
 * @throws RangeError with fewer than two days, as many standard deviations as means not given, or fewer than two
 *   readings a day
 * @see JCGM 100:2008 (GUM), H.5.2
 */
export function repeatedDays({ means, standardDeviations, readingsPerDay }: DailySeries): RepeatedDays {
  const days = means.length;
  if (days !== standardDeviations.length)
    throw new RangeError('repeatedDays requires a deviation for each mean');
  if (!(readingsPerDay >= 2)) throw new RangeError('repeatedDays requires at least two readings a day');
  const { mean, standardDeviation } = univariateSummary(means);
  const betweenVariance = readingsPerDay * standardDeviation ** 2;
  const withinVariance = standardDeviations.reduce((sum, deviation) => sum + deviation ** 2, 0) / days;
  return {
    mean,
    standardDeviationOfMeans: standardDeviation,
    betweenAsReading: Math.sqrt(betweenVariance),
    within: Math.sqrt(withinVariance),
    fRatio: betweenVariance / withinVariance,
    betweenDf: days - 1,
    withinDf: days * (readingsPerDay - 1),
    betweenDays: Math.sqrt(Math.max(0, betweenVariance - withinVariance) / readingsPerDay),
    uncertaintyOfMean: standardDeviation / Math.sqrt(days),
  };
}

/**
 * Largest variance ratio that chance alone exceeds with probability 1 − confidence.
 *
 * @example largestChanceRatio(9, 40, 0.95) // 2.12
 */
export function largestChanceRatio(betweenDf: number, withinDf: number, confidence: number): number {
  return fQuantile(confidence, betweenDf, withinDf);
}
