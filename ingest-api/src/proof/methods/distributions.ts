import { normalCdf } from '../../analysis/distributions/normal.js';
import { tFactor } from '../../analysis/distributions/student-t.js';
import studentT from '../cases/dist-gum-g2-t.json';
import { proof, type Proof } from '../proof.types.js';

/** The table writes 68.27, 95.45 and 99.73 % for the fractions within one, two and three standard deviations. */
const SIGMAS_OF_PERCENT: ReadonlyMap<number, number> = new Map([
  [68.27, 1],
  [95.45, 2],
  [99.73, 3],
]);

function fraction(percent: number): number {
  const sigmas = SIGMAS_OF_PERCENT.get(percent);
  return sigmas === undefined ? percent / 100 : 1 - 2 * normalCdf(-sigmas);
}

export const distributionProofs: readonly Proof[] = [
  proof(studentT, ({ percent, nu }) =>
    Object.fromEntries(
      nu.map((degrees) => [degrees, percent.map((share) => tFactor(fraction(share), Number(degrees)))]),
    ),
  ),
];
