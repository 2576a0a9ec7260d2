/** Boltzmann constant over elementary charge in V/K (both exact in the SI since 2019). */
const BOLTZMANN_OVER_CHARGE = 1.380649e-23 / 1.602176634e-19;

/** V_BE of a small-signal silicon transistor at 25 °C (common practice: about 0.65 V). */
const BASE_EMITTER_VOLTS_AT_25 = 0.65;

/** V_BE falls by about 2 mV for each °C (common practice). */
const BASE_EMITTER_VOLTS_PER_CELSIUS = -0.002;

/** Thermal voltage V_T = k·T/q in V (textbook formula, from memory). */
export function thermalVolts(celsius: number): number {
  return BOLTZMANN_OVER_CHARGE * (celsius + 273.15);
}

/** V_BE in V at a junction temperature in °C. */
export function baseEmitterVolts(celsius: number): number {
  return BASE_EMITTER_VOLTS_AT_25 + BASE_EMITTER_VOLTS_PER_CELSIUS * (celsius - 25);
}

/**
 * Collector current with the Early factor, I_C = I_S·exp(V_BE/V_T)·(1 + V_CE/V_A) (textbook formula, from
 * memory), written with the current at V_CE = 0 in place of I_S·exp(V_BE/V_T).
 *
 * @param zeroAmps current extrapolated to V_CE = 0, in A
 * @param collectorEmitterVolts V_CE in V
 * @param earlyVolts Early voltage V_A in V
 */
export function collectorAmps(zeroAmps: number, collectorEmitterVolts: number, earlyVolts: number): number {
  return zeroAmps * (1 + collectorEmitterVolts / earlyVolts);
}

/**
 * Output resistance of a transistor, r_o = (V_A + V_CE)/I_C in Ω: the reciprocal slope of the collector
 * current with the Early factor (textbook formula, from memory).
 */
export function transistorOutputOhms(
  earlyVolts: number,
  collectorEmitterVolts: number,
  collectorAmps: number,
): number {
  return (earlyVolts + collectorEmitterVolts) / collectorAmps;
}

/**
 * Share of the active current that is left near saturation, 1 − exp(−V_CE/V_T): the Ebers–Moll collector
 * current with a reverse current gain near one (textbook formula, from memory). Nothing flows below V_CE = 0.
 */
export function saturationFactor(collectorEmitterVolts: number, celsius: number): number {
  return collectorEmitterVolts <= 0 ? 0 : 1 - Math.exp(-collectorEmitterVolts / thermalVolts(celsius));
}
