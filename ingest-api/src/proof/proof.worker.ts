import { runProof } from './run-proof.js';
import type { ProofRow } from './proof.types.js';

/** Runs in a worker thread: a tenth of a second of computing must not hold up the intake. */
export default function computeProof(): ProofRow[] {
  return runProof();
}
