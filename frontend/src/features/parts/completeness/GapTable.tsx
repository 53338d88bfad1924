import { useQuery } from '@tanstack/react-query';
import { Skeleton } from 'antd';
import { useState } from 'react';
import { partsQuery } from '../../../api/parts';
import { LoadFailure } from '../../../components/LoadFailure';
import { Pages } from '../../../components/Pages';
import { Table } from '../../../components/Table';
import type { KindOfPart } from '../kindOfPart';
import type { PartsView } from '../partsView';
import styles from './Completeness.module.css';
import { GapRow } from './GapRow';

interface GapTableProps {
  kind: KindOfPart;
  view: PartsView;
}

const PAGE = 50;
const NOTHING: readonly string[] = [];

/** The parts, those that the ranking misses most of first, in pages. */
export function GapTable({ kind, view }: GapTableProps) {
  const [page, setPage] = useState(1);
  const query = { sort: 'completeness', ...view, limit: PAGE, offset: (page - 1) * PAGE };
  const { data, error, refetch } = useQuery({ ...partsQuery(kind.reader, query), staleTime: Infinity });
  if (error) return <LoadFailure error={error} onRetry={refetch} />;
  if (data === undefined) return <Skeleton title={false} paragraph={{ rows: 12, width: '100%' }} />;
  if (data.total === 0) return <p>No part matches, or none lacks what you asked for.</p>;
  return (
    <>
      <div className={styles.scroll}>
        <Table className={styles.table} aria-label="Parts by completeness">
          <thead>
            <tr>
              <th scope="col">part</th>
              <th scope="col">complete</th>
              <th scope="col">lacks, what the ranking misses most first</th>
            </tr>
          </thead>
          <tbody>
            {data.items.map((part) => (
              <GapRow
                key={`${part.id} ${view.missing?.join() ?? ''}`}
                kind={kind}
                part={part}
                asked={view.missing ?? NOTHING}
              />
            ))}
          </tbody>
        </Table>
      </div>
      <Pages page={page} pageSize={PAGE} total={data.total} onChange={setPage} />
    </>
  );
}
