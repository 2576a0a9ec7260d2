import type { CodedText } from './result.types.js';
import type { Evaluation, EvaluationContext } from './evaluate-post.js';
import type { PostedResult } from './result.types.js';

/** Facts that only the running system knows. */
export interface WarningFacts {
  /** Local day of the site, `YYYY-MM-DD`. */
  today: string;
  /** When this station last measured a golden unit of the product; null for never. */
  lastGoldenAt: number | null;
  /** Largest impedance that this sweep's meter and span can prove, Ω; null when unknown. */
  ceilingOhms: number | null;
}

const HOUR_MS = 3_600_000;

/** What the station should see to. Warnings change no verdict. */
export function findWarnings(
  post: PostedResult,
  context: EvaluationContext,
  evaluation: Evaluation,
  facts: WarningFacts,
): CodedText[] {
  const warnings: CodedText[] = [];
  const warn = (code: string, text: string): void => void warnings.push({ code, text });
  for (const [kind, meter] of [
    ['ammeter', context.ammeter],
    ['voltmeter', context.voltmeter],
  ] as const) {
    if (meter?.calibrationDueOn != null && meter.calibrationDueOn < facts.today) {
      warn('calibrationOverdue', `The ${kind}'s calibration was due on ${meter.calibrationDueOn}.`);
    }
  }
  const golden = goldenText(context, facts);
  if (golden !== null && evaluation.runKind === 'production') warn('goldenDue', golden);
  const coarse = coarseText(evaluation, facts.ceilingOhms);
  if (coarse !== null) warn('rangeTooCoarse', coarse);
  if (evaluation.flags.includes('planOutdated')) {
    warn(
      'planOutdated',
      `Test plan ${evaluation.plan?.version} is in force; this was measured by ${post.testPlanVersion}.`,
    );
  }
  if (evaluation.flags.includes('clockSkew'))
    warn('clockSuspect', "The station's clock is more than 30 s off the server's.");
  return warnings;
}

function goldenText(
  { product, receivedAt }: EvaluationContext,
  { lastGoldenAt }: WarningFacts,
): string | null {
  const hours = Math.min(...product.goldenCheckHours.values());
  if (!Number.isFinite(hours)) return null;
  if (lastGoldenAt !== null && receivedAt - lastGoldenAt <= hours * HOUR_MS) return null;
  return `Measure a golden unit of ${product.partNumber}: this station owes one every ${hours} h.`;
}

function coarseText({ limitSet }: Evaluation, ceilingOhms: number | null): string | null {
  const limitOhms = limitSet?.limits.find((limit) => limit.measure === 'outputImpedance')?.lower;
  if (limitOhms == null || ceilingOhms === null || limitOhms <= ceilingOhms / 2) return null;
  return limitOhms > ceilingOhms
    ? 'The impedance limit cannot be proven with this meter range and span: use a finer range or a wider span.'
    : 'The impedance limit is above half of what this meter range and span can prove: a finer range is wanted.';
}
