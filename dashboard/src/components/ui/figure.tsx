import { formatFigure, type FigureOptions } from '@/utils/format-figure';
import styles from './figure.module.css';

export interface FigureProps extends FigureOptions {
  value: number | null;
  unit: string;
  /** Shows "± U" behind the digits. */
  hasUncertainty?: boolean;
}

/** An engineering figure: SI prefix, digits that follow the uncertainty, "≥" or "≤" for a bound; a dash for none. */
export function Figure({ value, unit, hasUncertainty = false, ...options }: FigureProps) {
  if (value === null) return <span className={`figures ${styles.none}`}>–</span>;
  const text = formatFigure(value, unit, options);
  return (
    <span className="figures">
      {text.sign && <span className={styles.sign}>{text.sign} </span>}
      {text.digits}
      {hasUncertainty && text.uncertaintyDigits && (
        <span className={styles.uncertainty}> ± {text.uncertaintyDigits}</span>
      )}
      {text.unit && <span className={styles.unit}> {text.unit}</span>}
    </span>
  );
}
