import type { PostedResult, Product } from '@/types/api';

/** Readings of the API docs' example: a 500 µA source of about 12.1 MΩ, on an ammeter that resolves 10 nA. */
const readings: PostedResult['points'] = [
  { loadVolts: 0, outputAmps: 0.00050188 },
  { loadVolts: 1.2, outputAmps: 0.00050177 },
  { loadVolts: 2.4, outputAmps: 0.00050167 },
  { loadVolts: 3.6, outputAmps: 0.00050158 },
  { loadVolts: 4.8, outputAmps: 0.00050148 },
  { loadVolts: 6, outputAmps: 0.00050137 },
  { loadVolts: 7.2, outputAmps: 0.00050128 },
  { loadVolts: 8, outputAmps: 0.00050122 },
];
const READINGS_NOMINAL_AMPS = 0.0005;
const READINGS_TOP_VOLTS = 8;

export interface ExampleIdentity {
  resultId: string;
  /** UTC, ISO 8601. */
  startedAt: string;
}

/**
 * A post for a product of this site: the readings of the API docs' example, stretched over the product's promised
 * range and to its nominal current. It is practice, so it counts nowhere, whatever key it comes with.
 */
export function examplePost(product: Product, stage: string, identity: ExampleIdentity): PostedResult {
  const { nominalAmps, complianceLowVolts: low, complianceHighVolts: high } = product;
  const amps = nominalAmps / READINGS_NOMINAL_AMPS;
  const volts = (high - low) / READINGS_TOP_VOLTS;
  return {
    resultId: identity.resultId,
    runKind: 'practice',
    outcome: 'completed',
    partNumber: product.partNumber,
    serialNumber: `TRY-${identity.resultId.slice(0, 8).toUpperCase()}`,
    stage,
    startedAt: identity.startedAt,
    program: { name: 'first-post' },
    ammeter: { rangeAmps: tidy(0.001 * amps), resolutionAmps: tidy(1e-8 * amps) },
    points: readings.map(({ loadVolts, outputAmps }) => ({
      loadVolts: tidy(low + Number(loadVolts) * volts),
      outputAmps: tidy(Number(outputAmps) * amps),
    })),
  };
}

/** Without the last digits that binary fractions leave behind. */
const tidy = (value: number): number => Number(value.toPrecision(9));
