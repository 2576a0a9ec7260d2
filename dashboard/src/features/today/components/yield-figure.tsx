import { Fragment } from 'react';
import { YieldBarScale } from '@/components/ui/yield-bar';
import type { TodayProduct } from '@/types/api';
import { percentText } from '@/utils/format-figure';
import { yieldScale } from '@/utils/yield-scale';
import styles from './yield-figure.module.css';
import { YieldRow } from './yield-row';

/** First-pass yield of every product and stage on one ruled scale, with interval, target and the three shares. */
export function YieldFigure({ products }: { products: TodayProduct[] }) {
  const stages = products.flatMap((product) => product.stages);
  const scale = yieldScale(
    stages.map(({ firstPass }) => firstPass),
    stages.map(({ target }) => target),
  );
  return (
    <table className={styles.figure}>
      <caption className="visually-hidden">First-pass yield today by product and stage</caption>
      <thead>
        <tr>
          <th scope="col">Stage</th>
          <th scope="col" className={styles.scale}>
            <span className="visually-hidden">First-pass yield with interval and target</span>
            <YieldBarScale scale={scale} />
          </th>
          <th scope="col" className={styles.end}>
            %
          </th>
          <th scope="col">Target</th>
          <th scope="col">Pass · unproven · fail</th>
          <th scope="col" className={styles.end}>
            After retests
          </th>
          <th scope="col" className={styles.end}>
            7 days before
          </th>
        </tr>
      </thead>
      <tbody>
        {products.map((product) => (
          <Fragment key={product.partNumber}>
            <ProductRow product={product} />
            {product.stages.map((stage) => (
              <YieldRow key={stage.stage} partNumber={product.partNumber} stage={stage} scale={scale} />
            ))}
          </Fragment>
        ))}
      </tbody>
    </table>
  );
}

function ProductRow({ product: { partNumber, description, rolledThroughput } }: { product: TodayProduct }) {
  const share = rolledThroughput?.share ?? null;
  return (
    <tr className={styles.product}>
      <th scope="rowgroup" colSpan={7}>
        <span className="figures">{partNumber}</span>{' '}
        <span className={styles.description}>{description}</span>
        {share !== null && (
          <span className={styles.rolled}>
            through all stages at first pass <span className="figures">{percentText(share)}</span>
          </span>
        )}
      </th>
    </tr>
  );
}
