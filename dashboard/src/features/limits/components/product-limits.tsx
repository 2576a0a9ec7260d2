import { Facts } from '@/components/ui/facts';
import { Section } from '@/components/ui/section';
import type { Product } from '@/types/api';
import { figureText, percentText } from '@/utils/format-figure';
import { circuitWords, limitWords } from '../limit-words';
import styles from './product-limits.module.css';
import { StageLimits } from './stage-limits';

/** A product: what it promises, and what it has to prove at each stage. */
export function ProductLimits({ product }: { product: Product }) {
  const { complianceLowVolts, complianceHighVolts } = product;
  return (
    <Section title={product.partNumber} note={product.description}>
      {product.caution && (
        <p className={styles.caution}>
          <strong>Caution.</strong> {product.caution}
        </p>
      )}
      <div className={styles.facts}>
        <Facts
          facts={[
            ['Nominal current', figureText(product.nominalAmps, 'A')],
            ['Supply', figureText(product.supplyVolts, 'V')],
            ['Circuit', `${circuitWords(product.circuitKind)}, ${product.direction}`],
            [
              'Promised range',
              `${figureText(complianceLowVolts, 'V')} to ${figureText(complianceHighVolts, 'V')}`,
            ],
            ['Tolerance there', `${percentText(product.complianceTolerance)} loss of current`],
            [
              'Built-in limit',
              `compliance voltage ${limitWords({ measure: 'complianceVoltage', lower: complianceHighVolts, upper: null })}, at every stage`,
            ],
          ]}
        />
      </div>
      {product.stages.map((stage) => (
        <StageLimits key={stage.stage} partNumber={product.partNumber} stage={stage} />
      ))}
    </Section>
  );
}
