import { SelectField } from '@/components/ui/select-field';
import type { Product } from '@/types/api';
import styles from './product-choice.module.css';

export interface ProductChoiceProps {
  products: Product[];
  product: Product;
  stage: string;
  onChange: (partNumber: string, stage: string) => void;
}

/** What the example pretends to be: a product of this site and one of its stages. */
export function ProductChoice({ products, product, stage, onChange }: ProductChoiceProps) {
  return (
    <div className={styles.choice}>
      <SelectField
        label="Part number"
        value={product.partNumber}
        options={products.map(({ partNumber }) => ({ value: partNumber, label: partNumber }))}
        onChange={(partNumber) => onChange(partNumber, stage)}
      />
      <SelectField
        label="Stage"
        value={stage}
        options={product.stages.map((one) => ({ value: one.stage, label: one.stage }))}
        onChange={(chosen) => onChange(product.partNumber, chosen)}
      />
    </div>
  );
}
