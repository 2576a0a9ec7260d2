import type { CircuitKind } from './product-facts.js';

/**
 * Output current over reference current with finite beta (textbook formulas, from memory):
 * two-transistor mirror 1/(1 + 2/β), Wilson 1/(1 + 2/(β(β+2))), cascoded mirror about 1/(1 + 4/β), and for an
 * op-amp that holds the emitter current of a pass transistor α = β/(β + 1).
 */
export function transferRatio(kind: CircuitKind, beta: number): number {
  switch (kind) {
    case 'twoTransistorMirror':
      return 1 / (1 + 2 / beta);
    case 'wilsonMirror':
      return 1 / (1 + 2 / (beta * (beta + 2)));
    case 'cascode':
      return 1 / (1 + 4 / beta);
    case 'opAmpPassTransistor':
      return beta / (beta + 1);
  }
}

/**
 * Output resistance in Ω of a current source built from transistors of output resistance r_o
 * (textbook formulas, from memory): mirror r_o; Wilson about β·r_o/2; cascode about β·r_o. With an op-amp the
 * loop holds the emitter current, but the base current still follows V_CE, so a bipolar pass transistor
 * stays at about β·r_o whatever the loop gain.
 */
export function sourceOutputOhms(kind: CircuitKind, transistorOutputOhms: number, beta: number): number {
  switch (kind) {
    case 'twoTransistorMirror':
      return transistorOutputOhms;
    case 'wilsonMirror':
      return (beta * transistorOutputOhms) / 2;
    case 'cascode':
    case 'opAmpPassTransistor':
      return beta * transistorOutputOhms;
  }
}

/**
 * Voltage in V between the supply and the output transistor that the load never sees: one V_BE beneath the
 * Wilson's and the cascode's output transistor, the sense resistor's voltage under an op-amp, nothing in a
 * plain mirror.
 */
export function headroomVolts(kind: CircuitKind, baseEmitterVolts: number, senseVolts: number): number {
  switch (kind) {
    case 'twoTransistorMirror':
      return 0;
    case 'wilsonMirror':
    case 'cascode':
      return baseEmitterVolts;
    case 'opAmpPassTransistor':
      return senseVolts;
  }
}

/** Voltage in V across the set resistor: what is left of the supply above one or two V_BE, or the sense voltage. */
export function setResistorVolts(
  kind: CircuitKind,
  supplyVolts: number,
  baseEmitterVolts: number,
  senseVolts: number,
): number {
  switch (kind) {
    case 'twoTransistorMirror':
      return supplyVolts - baseEmitterVolts;
    case 'wilsonMirror':
    case 'cascode':
      return supplyVolts - 2 * baseEmitterVolts;
    case 'opAmpPassTransistor':
      return senseVolts;
  }
}
