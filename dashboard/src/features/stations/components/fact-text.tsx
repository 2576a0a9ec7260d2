import type { StationFact } from '../station-words';
import styles from './fact-text.module.css';

export function FactText({ fact }: { fact: StationFact }) {
  return <span className={fact.isTrouble ? styles.trouble : undefined}>{fact.text}</span>;
}
