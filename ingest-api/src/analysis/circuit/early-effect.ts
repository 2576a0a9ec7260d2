/**
 * Output resistance of a transistor from its Early voltage: `r_o = (V_A + V_CE)/I_C`, with I_C the actual collector
 * current at V_CE (from I_C = I_S·(1 + V_CE/V_A)). With V_CE = 0 the current is that at the edge of saturation and
 * the formula the short one, V_A/I_C.
 *
 * @param earlyVolts - V_A in V
 * @param collectorAmps - I_C in A, above 0
 * @param collectorEmitterVolts - V_CE in V at which I_C flows; default 0
 * @returns Ω
 * @throws RangeError when the current is not positive
 * @see Sedra & Smith, Microelectronic Circuits (bipolar transistor chapter)
 */
export function earlyOutputResistance(
  earlyVolts: number,
  collectorAmps: number,
  collectorEmitterVolts = 0,
): number {
  if (!(collectorAmps > 0))
    throw new RangeError('earlyOutputResistance requires a collector current above 0');
  return (earlyVolts + collectorEmitterVolts) / collectorAmps;
}
