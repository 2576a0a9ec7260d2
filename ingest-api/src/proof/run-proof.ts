import { agreementWithin, agreementWithPrinted, digitsOf, type Agreement } from './agreement.js';
import { circuitProofs } from './methods/circuits.js';
import { distributionProofs } from './methods/distributions.js';
import { proportionProofs } from './methods/proportions.js';
import { regressionProofs } from './methods/regression.js';
import { riskProofs } from './methods/risks.js';
import { uncertaintyProofs } from './methods/uncertainty.js';
import { univariateProofs } from './methods/univariate.js';
import type { Computed, Proof, ProofCase, ProofFigure, ProofRow, ProofStatus } from './proof.types.js';

/** Every published case whose method is in use here. */
export const PROOFS: readonly Proof[] = [
  ...regressionProofs,
  ...univariateProofs,
  ...circuitProofs,
  ...uncertaintyProofs,
  ...riskProofs,
  ...distributionProofs,
  ...proportionProofs,
];

/**
 * Computes every published case with the product's own functions and sets the results beside the published figures.
 *
 * A figure has one row against its source. Where independent arithmetic gives more digits than the source prints,
 * a second row holds the computation to those; its status is `derived`.
 *
 * Takes about a tenth of a second of processor time; knows neither clock nor files.
 *
 * @throws Error when a computation does not return a figure that its case states
 */
export function runProof(proofs: readonly Proof[] = PROOFS): ProofRow[] {
  return proofs.flatMap(({ proofCase, compute }) => {
    const computed = flatten(compute());
    return proofCase.figures.flatMap((figure) => rowsOf(proofCase, figure, computed));
  });
}

function rowsOf(
  proofCase: ProofCase<unknown>,
  figure: ProofFigure,
  computed: ReadonlyMap<string, number>,
): ProofRow[] {
  const value = computed.get(figure.key);
  if (value === undefined)
    throw new Error(`case ${proofCase.id} states ${figure.key}, which is not computed`);
  const quantity = readable(figure.key);
  const rows: ProofRow[] = [];
  if (figure.published !== undefined) {
    const agreement = agreementWithPrinted(
      figure.published,
      value,
      figure.digits ?? {},
      proofCase.withinUnits,
      figure.tolerance,
    );
    const status = statusOf(figure.status ?? proofCase.status);
    rows.push(toRow(proofCase, { quantity, status, published: figure.published }, value, agreement));
    if (agreement.requiredDigits >= digitsOf(figure.tolerance)) return rows;
  }
  if (figure.recomputed !== undefined) {
    const agreement = agreementWithin(figure.recomputed, value, figure.tolerance);
    const published = figure.recomputed;
    rows.push(
      toRow(
        proofCase,
        { quantity: `${quantity} (recomputed)`, status: 'derived', published },
        value,
        agreement,
      ),
    );
  }
  return rows;
}

function toRow(
  { id, title, source, recomputedBy }: ProofCase<unknown>,
  figure: Pick<ProofRow, 'quantity' | 'status' | 'published'>,
  value: number,
  agreement: Agreement,
): ProofRow {
  return {
    caseId: id,
    title,
    source: figure.quantity.endsWith('(recomputed)') ? `independent recomputation: ${recomputedBy}` : source,
    ...figure,
    computed: String(Number(value.toPrecision(15))),
    ...agreement,
    ok: agreement.agreeingDigits >= agreement.requiredDigits,
  };
}

/** Nested results as one map, with the paths that the case files use. */
function flatten(computed: Computed, path = ''): Map<string, number> {
  if (typeof computed === 'number') return new Map([[path, computed]]);
  const parts: [string, Computed][] = Array.isArray(computed)
    ? (computed as readonly Computed[]).map((part, i) => [`${path}[${i}]`, part])
    : Object.entries(computed).map(([name, part]) => [path === '' ? name : `${path}.${name}`, part]);
  return new Map(parts.flatMap(([name, part]) => [...flatten(part, name)]));
}

/** `wilson_5_of_10[1]` → `wilson 5 of 10, no. 2`. */
function readable(key: string): string {
  return key
    .replace(/_+$/, '')
    .replaceAll('_', ' ')
    .replace(/\[(\d+)\]/g, (_, index: string) => `, no. ${Number(index) + 1}`);
}

function statusOf(status: string): ProofStatus {
  if (status === 'source read' || status === 'from memory' || status === 'derived') return status;
  throw new Error(`unknown status of a published figure: ${status}`);
}
