import { useQuery } from '@tanstack/react-query';
import { Skeleton } from 'antd';
import { useState } from 'react';
import { duplicatesQuery } from '../../api/parts';
import { countOf } from '../../components/countOf';
import { DuplicatesList } from '../../features/parts/duplicates/DuplicatesList';
import type { KindOfPart } from '../../features/parts/kindOfPart';
import { LoadFailure } from '../../components/LoadFailure';
import { PartsHead } from './PartsHead';
import styles from './PartsPage.module.css';

const PAGE = 20;

/** Parts that may be one, and the decision what becomes of them. */
export function DuplicatesPage({ kind }: { kind: KindOfPart }) {
  const [page, setPage] = useState(1);
  const { data, error, refetch } = useQuery(
    duplicatesQuery(kind.reader, { limit: PAGE, offset: (page - 1) * PAGE }),
  );
  return (
    <div className={styles.sheet}>
      <title>{`${kind.title}s, duplicates · Roothertz`}</title>
      <PartsHead
        kind={kind}
        place="duplicates"
        facts={data && data.total > 0 && `${countOf(data.total, 'pair')} of parts that may be one`}
      />
      {error ? (
        <LoadFailure error={error} onRetry={refetch} />
      ) : data === undefined ? (
        <Skeleton title={false} paragraph={{ rows: 12, width: '100%' }} />
      ) : data.total === 0 ? (
        <p>
          No two of your {kind.noun}s look like one, nor like a curated one: by part number, maker or figures.
        </p>
      ) : (
        <DuplicatesList
          kind={kind}
          pairs={data.items}
          total={data.total}
          page={page}
          pageSize={PAGE}
          onPage={setPage}
        />
      )}
    </div>
  );
}
