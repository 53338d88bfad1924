import { Skeleton } from 'antd';
import type { KindOfPart } from '../../features/parts/kindOfPart';
import { NoParts } from '../../features/parts/NoParts';
import { partsFacts } from '../../features/parts/partsFacts';
import { PartsFilters } from '../../features/parts/PartsFilters';
import { ChosenParts } from '../../features/parts/ChosenParts';
import { filterOf, isNarrowed, narrowingKeys } from '../../features/parts/partsView';
import { usePartsList } from '../../features/parts/usePartsList';
import { usePartsView } from '../../features/parts/usePartsView';
import { LoadFailure } from '../../components/LoadFailure';
import { PartsHead } from './PartsHead';
import styles from './PartsPage.module.css';

export function PartsPage({ kind }: { kind: KindOfPart }) {
  const { view, change } = usePartsView(kind);
  const list = usePartsList(kind.reader, view);
  const showAll = () =>
    change(Object.fromEntries(['search', ...narrowingKeys(kind)].map((key) => [key, undefined])));
  return (
    <div className={styles.page}>
      <title>{`${kind.title}s · Roothertz`}</title>
      <PartsHead
        kind={kind}
        place="list"
        facts={!list.isPending && !list.error && partsFacts(kind, list, view.search.trim() !== '')}
      />
      <PartsFilters kind={kind} view={view} change={change} />
      {list.error ? (
        <LoadFailure error={list.error} onRetry={list.retry} />
      ) : list.isPending ? (
        <Skeleton title={false} paragraph={{ rows: 12, width: '100%' }} />
      ) : list.parts.length === 0 ? (
        <NoParts kind={kind} isNarrowed={isNarrowed(kind, view)} onShowAll={showAll} />
      ) : (
        <ChosenParts
          kind={kind}
          parts={list.parts}
          matching={list.matching}
          filter={filterOf(view)}
          sort={view.sort}
          onSort={(sort) => change({ sort })}
        />
      )}
    </div>
  );
}
