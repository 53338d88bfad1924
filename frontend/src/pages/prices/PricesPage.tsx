import { Button, Skeleton } from 'antd';
import { useState } from 'react';
import { NoPrices } from '../../features/prices/NoPrices';
import { PricesFacts } from '../../features/prices/PricesFacts';
import { PricesFilters } from '../../features/prices/PricesFilters';
import { isNarrowed, NARROWING_KEYS } from '../../features/prices/pricesView';
import { PricesWork } from '../../features/prices/PricesWork';
import { PriceSettingsDrawer } from '../../features/prices/settings/PriceSettingsDrawer';
import { usePriceList } from '../../features/prices/usePriceList';
import { usePricesView } from '../../features/prices/usePricesView';
import { LoadFailure } from '../../components/LoadFailure';
import styles from './PricesPage.module.css';

const EVERYTHING = Object.fromEntries(NARROWING_KEYS.map((key) => [key, undefined]));

/** What the team pays for its parts, kept true by purchasing and seen by everybody. */
export function PricesPage() {
  const { view, change } = usePricesView();
  const { list, error, retry } = usePriceList(view);
  const [areSettingsOpen, setSettingsOpen] = useState(false);
  return (
    <div className={styles.page}>
      <title>Prices · Roothertz</title>
      <div className={styles.head}>
        <h1>Prices</h1>
        <PricesFacts view={view} change={change} />
      </div>
      <div>
        <PricesFilters view={view} change={change} suppliers={list?.suppliers ?? []} />
        {view.partId !== undefined && (
          <p className={styles.note}>
            Only one part is shown. <Button onClick={() => change(EVERYTHING)}>Show all offers</Button>
          </p>
        )}
        {error && <LoadFailure error={error} onRetry={retry} className={styles.note} />}
      </div>
      {list ? (
        <PricesWork
          list={list}
          sort={view.sort}
          onSort={(sort) => change({ sort })}
          onSettings={() => setSettingsOpen(true)}
        >
          <NoPrices
            isNarrowed={isNarrowed(view)}
            onShowAll={() => change(EVERYTHING)}
            onShowMissing={() => change({ state: 'missing', library: 'team' })}
          />
        </PricesWork>
      ) : error ? null : (
        <Skeleton title={false} paragraph={{ rows: 12, width: '100%' }} />
      )}
      <PriceSettingsDrawer isOpen={areSettingsOpen} onClose={() => setSettingsOpen(false)} />
    </div>
  );
}
