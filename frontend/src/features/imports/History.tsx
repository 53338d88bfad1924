import { useQuery } from '@tanstack/react-query';
import { Button, Pagination, Skeleton } from 'antd';
import { useState } from 'react';
import { importsQuery } from '../../api/imports';
import { detailOf } from '../../api/problem';
import { Table } from '../../components/Table';
import styles from './History.module.css';
import { HistoryRow } from './HistoryRow';

const PAGE = 50;
const COLUMNS = ['file', 'read by', 'new', 'changed', 'unchanged', 'doubtful', 'refused', 'outcome', ''];

/** The team's imports, the latest first. */
export function History() {
  const [page, setPage] = useState(1);
  const { data, error, refetch } = useQuery(importsQuery(page));
  if (error)
    return (
      <p role="alert">
        {detailOf(error)} <Button onClick={() => void refetch()}>Try again</Button>
      </p>
    );
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
      {data.total > PAGE && (
        <Pagination
          size="small"
          current={page}
          pageSize={PAGE}
          total={data.total}
          showSizeChanger={false}
          onChange={setPage}
        />
      )}
    </>
  );
}
