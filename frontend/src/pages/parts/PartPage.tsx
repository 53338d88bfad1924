import { Link, useParams } from 'react-router-dom';
import { LoadedPart } from '../../features/parts/LoadedPart';
import { PartActions } from '../../features/parts/PartActions';
import { PartDensity } from '../../features/parts/PartDensity';
import { PartDerived } from '../../features/parts/PartDerived';
import { PartParameters } from '../../features/parts/PartParameters';
import { PartTitle } from '../../features/parts/PartTitle';
import styles from './PartPage.module.css';

export function PartPage() {
  const { id = '' } = useParams();
  return (
    <LoadedPart id={id}>
      {(part) => (
        <div className={styles.page}>
          <title>{`${part.partNumber} · Roothertz`}</title>
          <Link to="/parts" className={styles.back}>
            Parts
          </Link>
          <div className={styles.head}>
            <PartTitle part={part} />
            <PartActions part={part} />
          </div>
          <section className={styles.parameters}>
            <h2 className={styles.heading}>Parameters of one amplifier</h2>
            <PartParameters part={part} />
          </section>
          <section className={styles.picture}>
            <h2 className={styles.heading}>Noise density over frequency</h2>
            <PartDensity part={part} />
            <h2 className={styles.heading}>What follows</h2>
            <PartDerived amplifier={part.amplifier} />
          </section>
          <p className={styles.caution}>
            Figures are estimates from typical data: verify on the bench and against the data sheet’s limits.
          </p>
        </div>
      )}
    </LoadedPart>
  );
}
