import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { Skeleton } from 'antd';
import { useState } from 'react';
import { type Import, importRowsQuery, type RowList } from '../../api/imports';
import { LoadFailure } from '../../components/LoadFailure';
import { Pages } from '../../components/Pages';
import { KINDS } from './kinds';
import { RefusedTable } from './RefusedTable';
import { RowsTable } from './RowsTable';
import styles from './Verdicts.module.css';

interface RowPagesProps {
  imported: Import;
  list: RowList;
  limit: number;
}

function nothing(list: RowList, row: string): string {
  const words: Record<RowList, string> = {
    new: `No row adds ${row}.`,
    changed: `No row changes ${row}.`,
    unchanged: 'No row says what stands there already.',
    doubtful: 'No accepted row is doubtful.',
    refused: 'No row is refused.',
    kept: 'No row was kept.',
  };
  return words[list];
}

/** The rows of one verdict, in pages. */
export function RowPages({ imported: { id, kind }, list, limit }: RowPagesProps) {
  const [page, setPage] = useState(1);
  const query = importRowsQuery(id, { list, limit, offset: (page - 1) * limit });
  const { data, error, refetch } = useQuery({ ...query, placeholderData: keepPreviousData });
  if (error) return <LoadFailure error={error} onRetry={refetch} />;
  if (data === undefined) return <Skeleton title={false} paragraph={{ rows: 6, width: '100%' }} />;
  if (data.items.length === 0) return <p className={styles.nothing}>{nothing(list, KINDS[kind].row)}</p>;
  return (
    <>
      <div className={styles.scroll}>
        {list === 'refused' ? (
          <RefusedTable rows={data.items} />
        ) : (
          <RowsTable view={KINDS[kind].view} rows={data.items} />
        )}
      </div>
      <Pages page={page} pageSize={limit} total={data.total} onChange={setPage} className={styles.pages} />
    </>
  );
}
