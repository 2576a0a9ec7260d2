/** How well a published figure is known: see the words in the table of the proof. */
export type ProofStatus = 'source read' | 'from memory' | 'derived';

/** One line of the proof: a figure of a published case and what this installation computes for it. */
export interface ProofRow {
  caseId: string;
  title: string;
  source: string;
  /**
   * `source read`: the printed figure was seen in some text; `from memory`: recalled, then recomputed; `derived`: no
   * printed figure is known, the value was computed independently, to more digits than a program reaches.
   */
  status: ProofStatus;
  quantity: string;
  published: string;
  computed: string;
  agreeingDigits: number;
  requiredDigits: number;
  ok: boolean;
}

/** How many digits of a printed figure count: significant ones, decimals, or all of an exact number. */
export interface StatedDigits {
  sig?: number;
  dp?: number;
  exact?: boolean;
}

/** What a program in double precision should reach: a relative or an absolute deviation. */
export interface Tolerance {
  rel?: number;
  abs?: number;
}

export interface ProofFigure {
  /** Where the computation returns it: a path such as `estimate.B1` or `wilson[0]`. */
  key: string;
  /** The digits of the source, as text so that none is lost. */
  published?: string;
  digits?: StatedDigits;
  /** The same quantity by independent arithmetic of many digits. */
  recomputed?: string;
  tolerance: Tolerance;
  /** Where it differs from the case's. */
  status?: string;
}

/** A published case as it stands in `cases/`. */
export interface ProofCase<Inputs> {
  id: string;
  title: string;
  checks: string;
  source: string;
  status: string;
  /** Which text was seen when the figures were collected. */
  seenIn: string;
  recomputedBy: string;
  /** How many units of its last digit a printed figure may be off: ½ when rounded, more when the source is coarse. */
  withinUnits: number;
  notes?: string;
  inputs: Inputs;
  figures: ProofFigure[];
}

/** Numbers by name, nested as the case file nests them. */
export type Computed = number | readonly Computed[] | { readonly [name: string]: Computed };

/** A case with its computation bound to it. */
export interface Proof {
  proofCase: ProofCase<unknown>;
  compute: () => Computed;
}

/** Binds a case to the product's own functions that compute it. */
export function proof<Inputs>(proofCase: ProofCase<Inputs>, compute: (inputs: Inputs) => Computed): Proof {
  return { proofCase, compute: () => compute(proofCase.inputs) };
}
