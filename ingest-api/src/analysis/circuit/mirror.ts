/**
 * Textbook formulas of current mirrors, for judging whether a measured unit is plausible for its circuit kind.
 * β is the current gain (dimensionless), r_o the transistor's output resistance in Ω.
 *
 * @see A. S. Sedra, K. C. Smith, Microelectronic Circuits (chapter on current mirrors)
 */

/** Output over reference current of the two-transistor mirror: 1/(1 + 2/β), the base currents being lost. */
export function twoTransistorMirrorRatio(beta: number): number {
  return 1 / (1 + 2 / beta);
}

/** Output over reference current of the Wilson mirror: 1/(1 + 2/(β(β+2))). */
export function wilsonMirrorRatio(beta: number): number {
  return 1 / (1 + 2 / (beta * (beta + 2)));
}

/** What the two-transistor mirror lacks of the reference current, as a fraction: 2/(β+2), about 2/β. */
export function twoTransistorMirrorError(beta: number): number {
  return 2 / (beta + 2);
}

/** What the Wilson mirror lacks, as a fraction: 2/(β(β+2)+2), about 2/β². Not 1 − ratio, which would lose digits. */
export function wilsonMirrorError(beta: number): number {
  return 2 / (beta * (beta + 2) + 2);
}

/** Output resistance of the two-transistor mirror: that of its output transistor. Ω. */
export function twoTransistorMirrorResistance(transistorOhms: number): number {
  return transistorOhms;
}

/** Output resistance of the Wilson mirror: β·r_o/2. Ω. */
export function wilsonMirrorResistance(beta: number, transistorOhms: number): number {
  return (beta * transistorOhms) / 2;
}
