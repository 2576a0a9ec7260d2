import type { CodedText } from './result.types.js';

/** What each flag means, in the words of the unit page. */
const texts: Readonly<Record<string, string>> = {
  complianceShort: 'The current falls away below the promised load voltage.',
  curved: 'The readings bend: a straight line does not describe them all.',
  fewPoints: 'Few points: what they can prove is little.',
  resolutionAssumed: "The meter's resolution was not given; the smallest step in the readings was taken.",
  driftUnknown: 'No point was repeated: drift during the sweep is not known.',
  risingCurrent: 'The current rises with the load voltage: there is no output impedance.',
  rangeChanged: 'The ammeter changed its range during the sweep.',
  rangeNotCovered: 'The points cover less than 95 % of the promised range.',
  overload: 'The meter showed overload at some point.',
  weightsUnused: 'Only some points carry a standard deviation; the fit is unweighted.',
  supersededLimits:
    'Judged by the limits in force when it was measured; newer ones were released before it arrived.',
  planOutdated: 'Measured by a test plan that was not in force.',
  verdictMismatch: 'The station said otherwise.',
  loadAboveSupply: 'A load voltage lies above the supply voltage.',
  finishedBeforeStarted: 'It was finished before it was started, by its own times.',
  clockSkew: "The station's clock was more than 30 s off.",
  goldenPostedAsProduction: "A golden unit's serial number came as production; it was taken as golden.",
  instrumentMismatch:
    "Post and register state different accuracies of an instrument; the register's were used.",
};

export const describeFlags = (flags: readonly string[]): CodedText[] =>
  flags.map((code) => ({ code, text: texts[code] ?? code }));
