/** Numbers drawn from a seed: the same seed gives the same numbers everywhere. */
export interface SeededRandom {
  /** Uniform in [0, 1). */
  uniform(): number;
  /** Normal with mean 0 and standard deviation 1. */
  normal(): number;
}

/**
 * A small fast counting generator (sfc32, period about 2¹²⁸ in practice) with normal numbers by the polar method.
 * Good enough to simulate with, useless for secrets.
 *
 * Source: C. Doty-Humphrey, PractRand, sfc32; G. Marsaglia & T. A. Bray (1964), polar method (from memory).
 */
export function seededRandom(seed: number): SeededRandom {
  let a = 0;
  let b = seed | 0;
  let c = (seed / 4294967296) | 0;
  let counter = 1;
  let spare: number | null = null;
  const next = (): number => {
    const sum = (a + b + counter) | 0;
    counter = (counter + 1) | 0;
    a = b ^ (b >>> 9);
    b = (c + (c << 3)) | 0;
    c = ((c << 21) | (c >>> 11)) + sum;
    c |= 0;
    return sum >>> 0;
  };
  for (let i = 0; i < 15; i++) next();
  const uniform = () => next() / 4294967296;
  const normal = () => {
    if (spare !== null) {
      const kept = spare;
      spare = null;
      return kept;
    }
    for (;;) {
      const x = 2 * uniform() - 1;
      const y = 2 * uniform() - 1;
      const radius = x * x + y * y;
      if (radius >= 1 || radius === 0) continue;
      const scale = Math.sqrt((-2 * Math.log(radius)) / radius);
      spare = y * scale;
      return x * scale;
    }
  };
  return { uniform, normal };
}
