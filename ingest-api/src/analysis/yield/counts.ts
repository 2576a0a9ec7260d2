/** @throws RangeError unless both are whole numbers with 0 ≤ passed ≤ total */
export function requireCounts(passed: number, total: number, caller: string): void {
  const valid = Number.isInteger(passed) && Number.isInteger(total) && passed >= 0 && passed <= total;
  if (!valid)
    throw new RangeError(
      `${caller} requires whole counts with 0 ≤ passed ≤ total, got ${passed} of ${total}`,
    );
}
