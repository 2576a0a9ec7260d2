import { Link } from 'react-router-dom';
import { Button } from '@/components/ui/button';
import { PageHeader } from '@/components/ui/page-header';
import { SlopeMark } from '@/components/ui/slope-mark';
import { TimeText } from '@/components/ui/time-text';
import { VerdictMark } from '@/components/ui/verdict-mark';
import { paths } from '@/config/paths';
import type { RunItem, Unit } from '@/types/api';
import styles from './unit-head.module.css';

/** Which unit this is and how it stands, with its mark drawn large. */
export function UnitHead({ unit, shown }: { unit: Unit; shown: RunItem }) {
  return (
    <>
      <div className={styles.head}>
        <SlopeMark slope={shown.slope} size={120} />
        <div className={styles.words}>
          <PageHeader
            title={`${unit.serialNumber} ${unit.partNumber}`}
            heading={
              <span className={styles.heading}>
                <span className="figures">{unit.serialNumber}</span>{' '}
                <VerdictMark verdict={shown.verdict} size={24} />
              </span>
            }
            lead={<UnitLead unit={unit} shown={shown} />}
            actions={<Button onClick={() => window.print()}>Print the record</Button>}
          />
        </div>
      </div>
      {unit.caution && (
        <p className={styles.caution}>
          <strong>Caution.</strong> {unit.caution}
        </p>
      )}
    </>
  );
}

function UnitLead({ unit: { partNumber, description, lot }, shown }: { unit: Unit; shown: RunItem }) {
  return (
    <>
      <span className="figures">{partNumber}</span> {description}
      {lot && (
        <>
          , lot{' '}
          <Link className="figures" to={paths.units({ partNumber, lot })}>
            {lot}
          </Link>
        </>
      )}
      <br />
      {shown.stage}, {shown.attempt === null ? 'not counted' : `attempt ${shown.attempt}`}, tested{' '}
      <TimeText at={shown.startedAt} show="both" /> on {shown.station}
    </>
  );
}
