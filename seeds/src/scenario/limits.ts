import type { Limit } from '@ampkeep/ingest-api/dist/analysis/analysis.types.js';
import type { StageFacts } from '@ampkeep/station-sim/dist/circuit/product-facts.js';

/** The released limits of a stage: `simple`, so that an adequate meter proves every unit one way or the other. */
export function limitsOf(stage: StageFacts): Limit[] {
  return stage.limits.map((limit) => ({ ...limit, rule: 'simple', guardFactor: 1 }));
}
