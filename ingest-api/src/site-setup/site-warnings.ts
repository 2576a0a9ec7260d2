import type { DescribedProduct, DescribedStage, SiteDescription } from './site-description.js';

/** Fewest load steps in the lower half of the promised range from which a knee can be claimed. */
const SEED_POINTS = 4;
const FEW_POINTS = 5;

/** What can be applied but will disappoint: said in the report of a setup, one line each. */
export const findSiteWarnings = ({ products }: SiteDescription): string[] =>
  products.flatMap((product) => product.stages.flatMap((stage) => stageWarnings(product, stage)));

function stageWarnings(product: DescribedProduct, stage: DescribedStage): string[] {
  const place = `warning, ${product.partNumber} ${stage.stage}:`;
  const { loadVolts } = stage.testPlan;
  const middle = (product.complianceLowVolts + product.complianceHighVolts) / 2;
  const lowerHalf = loadVolts.filter((volts) => volts >= product.complianceLowVolts && volts <= middle);
  const warnings: string[] = [];
  if (loadVolts.length < FEW_POINTS)
    warnings.push(`${place} fewer than ${FEW_POINTS} load steps prove little`);
  if (lowerHalf.length < SEED_POINTS) {
    warnings.push(
      `${place} fewer than ${SEED_POINTS} load steps in the lower half of the promised range, so no knee can be claimed`,
    );
  }
  if (isToleranceCoarse(product, stage)) {
    warnings.push(`${place} the compliance tolerance is more than ten times the allowed load regulation`);
  }
  return warnings;
}

/** τ is a fraction, load regulation in percent. */
function isToleranceCoarse({ complianceTolerance }: DescribedProduct, { limits }: DescribedStage): boolean {
  const limit = limits.find(({ measure }) => measure === 'loadRegulation');
  const allowedPercent = Math.max(Math.abs(limit?.lower ?? 0), Math.abs(limit?.upper ?? 0));
  return allowedPercent > 0 && 100 * complianceTolerance > 10 * allowedPercent;
}
