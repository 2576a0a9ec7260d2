/** @throws RangeError when `probability` is not a number in [0, 1] */
export function requireProbability(probability: number, caller: string): void {
  if (!(probability >= 0 && probability <= 1)) {
    throw new RangeError(`${caller} requires a probability from 0 to 1, got ${probability}`);
  }
}

/** @throws RangeError when `value` is not a positive number (infinity is allowed: the limiting distribution) */
export function requirePositive(value: number, name: string, caller: string): void {
  if (!(value > 0)) throw new RangeError(`${caller} requires ${name} above 0, got ${value}`);
}
