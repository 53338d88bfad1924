import { Button, Skeleton } from 'antd';
import { Link } from 'react-router-dom';
import { detailOf } from '../../api/problem';
import { useMayDo } from '../../components/useMember';
import { NoParts } from '../../features/parts/NoParts';
import { partsFacts } from '../../features/parts/partsFacts';
import { PartsFilters } from '../../features/parts/PartsFilters';
import { PartsGrid } from '../../features/parts/PartsGrid';
import { isNarrowed, PARTS_FILTERS } from '../../features/parts/partsView';
import { usePartsList } from '../../features/parts/usePartsList';
import { usePartsView } from '../../features/parts/usePartsView';
import styles from './PartsPage.module.css';

export function PartsPage() {
  const { view, change } = usePartsView();
  const list = usePartsList(view);
  const showAll = () =>
    change({ search: undefined, ...Object.fromEntries(PARTS_FILTERS.map(({ key }) => [key, undefined])) });
  return (
    <div className={styles.page}>
      <title>Parts · Roothertz</title>
      <div className={styles.head}>
        <h1>Parts</h1>
        <p className={styles.facts} role="status">
          {!list.isPending && !list.error && partsFacts(list, view.search.trim() !== '')}
        </p>
        <NewPartLink />
      </div>
      <PartsFilters view={view} change={change} />
      {list.error ? (
        <p role="alert">
          {detailOf(list.error)} <Button onClick={list.retry}>Try again</Button>
        </p>
      ) : list.isPending ? (
        <Skeleton title={false} paragraph={{ rows: 12, width: '100%' }} />
      ) : list.parts.length === 0 ? (
        <NoParts isNarrowed={isNarrowed(view)} onShowAll={showAll} />
      ) : (
        <PartsGrid parts={list.parts} sort={view.sort} onSort={(sort) => change({ sort })} />
      )}
    </div>
  );
}

function NewPartLink() {
  if (!useMayDo('parts.edit')) return null;
  return (
    <Link to="/parts/new" className={styles.new}>
      New op-amp
    </Link>
  );
}
