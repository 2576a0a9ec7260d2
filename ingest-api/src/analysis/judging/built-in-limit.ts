import type { Limit, ProductSpec } from '../analysis.types.js';

/**
 * Adds the limit that every product has without anyone releasing it: the current must be held up to the end of
 * the promised range, complianceVoltage ≥ V_hi.
 *
 * It is `guarded` with factor 1, unless the released set limits the compliance voltage itself: then that limit's
 * rule holds, and the stricter of the two lower limits.
 *
 * @param limits - the released limits
 * @returns the limits to judge by; the input is left alone
 */
export function withBuiltInLimit(limits: readonly Limit[], product: ProductSpec): Limit[] {
  const promised = product.complianceHighVolts;
  if (!limits.some((limit) => limit.measure === 'complianceVoltage')) {
    return [
      ...limits,
      { measure: 'complianceVoltage', lower: promised, upper: null, rule: 'guarded', guardFactor: 1 },
    ];
  }
  return limits.map((limit) =>
    limit.measure === 'complianceVoltage'
      ? { ...limit, lower: Math.max(promised, limit.lower ?? promised) }
      : limit,
  );
}
