import type { Product, YieldGroup } from '@/types/api';
import type { YieldQuery } from './yield-query';

/** The yield target of one product and stage; null where several are meant, or none is set. */
export function targetOf(products: Product[], partNumber?: string, stage?: string): number | null {
  const product = products.find((candidate) => candidate.partNumber === partNumber);
  return product?.stages.find((candidate) => candidate.stage === stage)?.yieldTarget ?? null;
}

/** The target of one group of a split. */
export function groupTarget(products: Product[], query: YieldQuery, { name }: YieldGroup): number | null {
  const partNumber = query.split === 'product' ? (name ?? undefined) : query.partNumber;
  const stage = query.split === 'stage' ? (name ?? undefined) : query.stage;
  return targetOf(products, partNumber, stage);
}
