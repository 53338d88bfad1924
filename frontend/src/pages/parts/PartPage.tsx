import type { ReactNode } from 'react';
import { Link, useParams } from 'react-router-dom';
import type { StoredPart } from '../../api/parts';
import type { KindOfPart } from '../../features/parts/kindOfPart';
import { LoadedPart } from '../../features/parts/LoadedPart';
import { PartActions } from '../../features/parts/PartActions';
import { PartParameters } from '../../features/parts/PartParameters';
import { PartTitle } from '../../features/parts/PartTitle';
import { PartPrices } from '../../features/prices/part/PartPrices';
import styles from './PartPage.module.css';

interface PartPageProps<Stored extends StoredPart> {
  kind: KindOfPart<Stored>;
  density: (part: Stored) => ReactNode;
  derived: (part: Stored) => ReactNode;
}

/** A part with its parameters, and what its kind makes of them. */
export function PartPage<Stored extends StoredPart>({ kind, density, derived }: PartPageProps<Stored>) {
  const { id = '' } = useParams();
  return (
    <LoadedPart kind={kind} id={id}>
      {(part) => (
        <div className={styles.page}>
          <title>{`${part.partNumber} · Roothertz`}</title>
          <Link to={kind.path} className={styles.back}>
            {kind.title}s
          </Link>
          <div className={styles.head}>
            <PartTitle kind={kind} part={part} />
            <PartActions kind={kind} part={part} />
          </div>
          <section className={styles.parameters}>
            <h2 className={styles.heading}>{kind.parametersTitle}</h2>
            <PartParameters fields={kind.catalogue} part={part} />
          </section>
          <section className={styles.picture}>
            <h2 className={styles.heading}>Noise density over frequency</h2>
            {density(part)}
            <h2 className={styles.heading}>What follows</h2>
            {derived(part)}
          </section>
          <section aria-labelledby="prices" className={styles.prices}>
            <h2 id="prices" className={styles.heading}>
              Prices
            </h2>
            <PartPrices partId={part.id} />
          </section>
          <p className={styles.caution}>
            Figures are estimates from typical data: verify on the bench and against the data sheet’s limits.
          </p>
        </div>
      )}
    </LoadedPart>
  );
}
