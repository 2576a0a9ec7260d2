import type { ProofRow } from '../proof.types.js';

/** A figure of a published case, and what this installation computes for it. */
export class ProofRowDto {
  /** @example "reg-nist-norris" */
  caseId!: string;

  /** @example "StRD linear regression: Norris" */
  title!: string;

  /** @example "NIST Statistical Reference Datasets (StRD), linear regression — Norris data set" */
  source!: string;

  /**
   * `source read`: the printed figure was seen in some text; `from memory`: recalled, then recomputed; `derived`: no
   * printed figure is known, the value was computed independently.
   * @example "source read"
   */
  status!: 'source read' | 'from memory' | 'derived';

  /** @example "estimate.B1" */
  quantity!: string;

  /**
   * The digits of the source, as text.
   * @example "1.00211681802045"
   */
  published!: string;

  /** @example "1.00211681802045" */
  computed!: string;

  /**
   * At most 15: double precision holds no more.
   * @example 14
   */
  agreeingDigits!: number;

  /** @example 11 */
  requiredDigits!: number;

  ok!: boolean;
}

/** Evidence that this installation computes correctly, recomputed when asked for. */
export class ProofDto {
  /** @example "2026-11-30T12:00:00.000Z" */
  computedAt!: string;

  /** @example "0.1.0" */
  version!: string;

  /** Rows that agree to the digits required. */
  passed!: number;

  failed!: number;

  rows!: ProofRowDto[];
}

export function toProofDto(rows: readonly ProofRow[], computedAt: Date, version: string): ProofDto {
  const passed = rows.filter(({ ok }) => ok).length;
  return {
    computedAt: computedAt.toISOString(),
    version,
    passed,
    failed: rows.length - passed,
    rows: [...rows],
  };
}
