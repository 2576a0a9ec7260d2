import type { Limit, PlanSpec, ProductSpec } from '../analysis/analysis.types.js';
import type { Product } from './models/product.model.js';

/** A version of a test plan or limit set that took effect at some time and stays until a newer one does. */
interface Versioned {
  version: number;
  releasedAt: number;
  effectiveAt: number;
}

export interface CataloguePlan extends Versioned, PlanSpec {
  loadVolts: number[];
  dwellMs: number;
  repeatFirst: boolean;
  upAndDown: boolean;
}

export interface CatalogueLimitSet extends Versioned {
  limits: Limit[];
  releasedBy: string;
}

export interface CatalogueStage {
  stageId: number;
  name: string;
  position: number;
  maxAttempts: number;
  yieldTarget: number | null;
  plans: CataloguePlan[];
  limitSets: CatalogueLimitSet[];
}

export interface CatalogueProduct {
  productId: number;
  partNumber: string;
  description: string;
  direction: Product['direction'];
  spec: ProductSpec;
  /** In the order in which a unit passes them. */
  stages: CatalogueStage[];
  /** Golden units' serial numbers with the longest time between two checks of a station. */
  goldenCheckHours: Map<string, number>;
}

/** What was in force at `time`: of all that had taken effect, the highest version. */
export function inForceAt<V extends Versioned>(versions: readonly V[], time: number): V | null {
  return versions.reduce<V | null>(
    (best, candidate) =>
      candidate.effectiveAt <= time && (best === null || candidate.version > best.version) ? candidate : best,
    null,
  );
}

export const findStage = (product: CatalogueProduct, name: string): CatalogueStage | undefined =>
  product.stages.find((stage) => stage.name === name);

/** Stages just before and after, in the order of the line. */
export function neighbours(
  product: CatalogueProduct,
  stage: CatalogueStage,
): { prior: CatalogueStage | null; next: CatalogueStage | null } {
  const index = product.stages.indexOf(stage);
  return { prior: product.stages[index - 1] ?? null, next: product.stages[index + 1] ?? null };
}

/** Extra-low voltage ends at 60 V d.c. (common practice; lower in wet places). */
const CAUTION_VOLTS = 60;

/** The caution that stands on product, plan and unit pages, or null. */
export function cautionFor({ supplyVolts, complianceHighVolts }: ProductSpec): string | null {
  if (Math.max(Math.abs(supplyVolts), Math.abs(complianceHighVolts)) <= CAUTION_VOLTS) return null;
  return (
    'Above 60 V d.c.: work on this product is for qualified persons only, by the rules of your site, IEC 61010-1 and local codes. ' +
    'A verdict is no safety approval.'
  );
}
