export interface UncertaintyComponent {
  /** u(x), in the unit of the input quantity. */
  standardUncertainty: number;
  /** c = ∂f/∂x; default 1. */
  sensitivity?: number;
  /** ν of u(x); default Infinity (known exactly). */
  degreesOfFreedom?: number;
}

export interface CombinedUncertainty {
  /** u_c(y), in the unit of the result. */
  standardUncertainty: number;
  /** ν_eff, not yet truncated; Infinity when every component is known exactly. */
  effectiveDegreesOfFreedom: number;
  /** |c·u(x)| of each component, in the order given. */
  contributions: number[];
}

/**
 * Combines the standard uncertainties of uncorrelated inputs, to first order, with the Welch–Satterthwaite
 * degrees of freedom:
 *
 * `u_c² = Σ(cᵢuᵢ)²`, `ν_eff = u_c⁴ / Σ((cᵢuᵢ)⁴/νᵢ)`
 *
 * For a product y = b·x₁·x₂…, give relative uncertainties with sensitivity 1: the result is relative too.
 *
 * @throws RangeError without components, on a negative uncertainty, or on ν that is not positive
 * @see JCGM 100:2008 (GUM), 5.1.2 equation (10), G.4.1 equation (G.2b)
 */
export function combineUncertainties(components: readonly UncertaintyComponent[]): CombinedUncertainty {
  if (components.length === 0) throw new RangeError('combineUncertainties requires at least one component');
  const contributions = components.map(
    ({ standardUncertainty, sensitivity = 1, degreesOfFreedom = Infinity }) => {
      if (!(standardUncertainty >= 0)) throw new RangeError('a standard uncertainty must be 0 or more');
      if (!(degreesOfFreedom > 0)) throw new RangeError('degrees of freedom must be above 0');
      return Math.abs(sensitivity * standardUncertainty);
    },
  );
  const standardUncertainty = Math.hypot(...contributions);
  // In shares of the whole, so that no fourth power can under- or overflow.
  const fourthPowers = components.reduce(
    (sum, { degreesOfFreedom = Infinity }, i) =>
      sum + share(contributions[i] ?? 0, standardUncertainty) ** 4 / degreesOfFreedom,
    0,
  );
  return { standardUncertainty, effectiveDegreesOfFreedom: 1 / fourthPowers, contributions };
}

function share(contribution: number, whole: number): number {
  return whole === 0 ? 0 : contribution / whole;
}

/** The second-order effect of two inputs that multiply each other in the model. */
export interface ProductTerm {
  /** ∂²f/∂x∂y, e.g. −l for a term −l·x·y. */
  mixedDerivative: number;
  firstUncertainty: number;
  secondUncertainty: number;
}

/**
 * Adds the second-order terms of products to a combined uncertainty: `u_c² + Σ(∂²f/∂x∂y)²·u(x)²·u(y)²`.
 *
 * They matter where an input's estimate is near zero, so that its partner has no first-order effect. Exact for
 * models that are linear in each input (all third derivatives vanish).
 *
 * @see JCGM 100:2008 (GUM), note to 5.1.2; H.1.7
 */
export function withProductTerms(standardUncertainty: number, terms: readonly ProductTerm[]): number {
  return Math.hypot(
    standardUncertainty,
    ...terms.map((term) => term.mixedDerivative * term.firstUncertainty * term.secondUncertainty),
  );
}
