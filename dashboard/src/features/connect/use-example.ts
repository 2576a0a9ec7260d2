import { useState } from 'react';
import { newUuid } from '@/lib/uuid';
import type { PostedResult, Product } from '@/types/api';
import { examplePost, type ExampleIdentity } from './example-post';

const newIdentity = (): ExampleIdentity => ({ resultId: newUuid(), startedAt: new Date().toISOString() });

export interface Example {
  product: Product;
  stage: string;
  post: PostedResult;
  choose: (partNumber: string, stage: string) => void;
}

/** The example for a chosen product and stage; another choice is another post and gets another identity. */
export function useExample(products: Product[]): Example | null {
  const [identity, setIdentity] = useState(newIdentity);
  const [chosen, setChosen] = useState({ partNumber: '', stage: 'final' });
  const product = products.find(({ partNumber }) => partNumber === chosen.partNumber) ?? products[0];
  const stage = (product?.stages.find((one) => one.stage === chosen.stage) ?? product?.stages.at(-1))?.stage;
  if (!product || stage === undefined) return null;

  const choose = (partNumber: string, wantedStage: string) => {
    setChosen({ partNumber, stage: wantedStage });
    setIdentity(newIdentity());
  };
  return { product, stage, post: examplePost(product, stage, identity), choose };
}
