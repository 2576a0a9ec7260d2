/** What a data sheet says of one range of an instrument, and what is true of this one. */
export interface Ammeter {
  serialNumber: string;
  rangeAmps: number;
  resolutionAmps: number;
  readingAccuracyPercent: number;
  rangeAccuracyPercent: number;
  burdenOhms: number;
  /** True error of reading as a fraction. */
  gainError: number;
  offsetAmps: number;
  noiseAmps: number;
}

export interface Voltmeter {
  serialNumber: string;
  rangeVolts: number;
  resolutionVolts: number;
  readingAccuracyPercent: number;
  rangeAccuracyPercent: number;
  inputOhms: number;
  /** True when its leads span load and ammeter together. */
  spansAmmeter: boolean;
  gainError: number;
  noiseVolts: number;
}

interface AmmeterRange {
  rangeAmps: number;
  resolutionAmps: number;
  burdenOhms: number;
}

/** The ranges of the line's five-and-a-half-digit ammeters (invented; figures as such meters have them). */
const ammeterRanges: readonly [AmmeterRange, ...AmmeterRange[]] = [
  { rangeAmps: 0.001, resolutionAmps: 1e-8, burdenOhms: 10 },
  { rangeAmps: 0.01, resolutionAmps: 1e-7, burdenOhms: 5 },
  { rangeAmps: 0.1, resolutionAmps: 1e-6, burdenOhms: 1 },
];

/** True errors of an ammeter that no data sheet tells. */
export interface AmmeterTruth {
  serialNumber: string;
  gainError: number;
}

/**
 * An ammeter on one of its ranges; its noise is a third of a digit.
 * @throws RangeError for a range it does not have
 */
export function ammeterOnRange(truth: AmmeterTruth, rangeAmps: number): Ammeter {
  const range = ammeterRanges.find((candidate) => candidate.rangeAmps === rangeAmps);
  if (!range) throw new RangeError(`No ammeter range of ${rangeAmps} A`);
  return {
    ...truth,
    ...range,
    readingAccuracyPercent: 0.02,
    rangeAccuracyPercent: 0.005,
    offsetAmps: 0.2 * range.resolutionAmps,
    noiseAmps: 0.3 * range.resolutionAmps,
  };
}

/** A voltmeter on its 20 V range. */
export function voltmeter(serialNumber: string, gainError: number): Voltmeter {
  return {
    serialNumber,
    rangeVolts: 20,
    resolutionVolts: 1e-4,
    readingAccuracyPercent: 0.01,
    rangeAccuracyPercent: 0.002,
    inputOhms: 1e10,
    spansAmmeter: false,
    gainError,
    noiseVolts: 5e-5,
  };
}
