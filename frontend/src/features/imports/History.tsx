import { useQuery } from '@tanstack/react-query';
import { Skeleton } from 'antd';
import { useState } from 'react';
import { importsQuery } from '../../api/imports';
import { LoadFailure } from '../../components/LoadFailure';
import { Pages } from '../../components/Pages';
import { Table } from '../../components/Table';
import styles from './History.module.css';
import { HistoryRow } from './HistoryRow';

const PAGE = 50;
const COLUMNS = ['file', 'read by', 'new', 'changed', 'unchanged', 'doubtful', 'refused', 'outcome', ''];

/** The team's imports, the latest first. */
export function History() {
  const [page, setPage] = useState(1);
  const { data, error, refetch } = useQuery(importsQuery(page));
  if (error) return <LoadFailure error={error} onRetry={refetch} />;
  if (data === undefined) return <Skeleton title={false} paragraph={{ rows: 6, width: '100%' }} />;
  if (data.total === 0)
    return (
      <p className={styles.nothing}>Your team has imported no list yet. The first one will stand here.</p>
    );
  return (
    <>
      <div className={styles.scroll}>
        <Table stacks className={styles.table}>
          <thead>
            <tr>
              {COLUMNS.map((label) => (
                <th key={label} scope="col">
                  {label || <span className="visually-hidden">act</span>}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {data.items.map((imported) => (
              <HistoryRow key={imported.id} imported={imported} />
            ))}
          </tbody>
        </Table>
      </div>
      <Pages page={page} pageSize={PAGE} total={data.total} onChange={setPage} />
    </>
  );
}
