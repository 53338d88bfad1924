import { useQuery } from '@tanstack/react-query';
import { Button, Skeleton } from 'antd';
import { useState } from 'react';
import { AUDIT_PAGE, auditExportAddress, auditQuery } from '../../api/audit';
import { LoadFailure } from '../../components/LoadFailure';
import { Pages } from '../../components/Pages';
import styles from './Trail.module.css';
import { TrailFilters } from './TrailFilters';
import { TrailTable } from './TrailTable';
import { useTrailFilter } from './useTrailFilter';

/** The team's trail: narrowed, in pages, and as a list for a spreadsheet. */
export function Trail() {
  const { filter, narrow, showAll } = useTrailFilter();
  const [page, setPage] = useState(1);
  const { data, error, refetch } = useQuery(auditQuery(filter, page));
  const isNarrowed = Object.keys(filter).length > 0;
  return (
    <>
      <div className={styles.bar}>
        <TrailFilters
          filter={filter}
          narrow={(changes) => {
            setPage(1);
            narrow(changes);
          }}
        />
        <a href={auditExportAddress(filter)} download>
          Export as CSV
        </a>
      </div>
      {error ? (
        <LoadFailure error={error} onRetry={refetch} />
      ) : data === undefined ? (
        <Skeleton title={false} paragraph={{ rows: 10, width: '100%' }} />
      ) : data.total === 0 ? (
        <p className={styles.nothing}>
          {isNarrowed ? 'Nothing of this was done. ' : 'Nothing has been changed yet.'}
          {isNarrowed && (
            <Button type="link" onClick={showAll}>
              Show all of it
            </Button>
          )}
        </p>
      ) : (
        <TrailTable entries={data.items} />
      )}
      {data !== undefined && (
        <Pages page={page} pageSize={AUDIT_PAGE} total={data.total} onChange={setPage} />
      )}
    </>
  );
}
