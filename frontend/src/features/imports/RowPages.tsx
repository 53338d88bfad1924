import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { Button, Pagination, Skeleton } from 'antd';
import { useState } from 'react';
import { type Import, importRowsQuery, type RowList } from '../../api/imports';
import { detailOf } from '../../api/problem';
import { count } from './importWords';
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
  if (error)
    return (
      <p role="alert">
        {detailOf(error)} <Button onClick={() => void refetch()}>Try again</Button>
      </p>
    );
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
      {data.total > limit && (
        <Pagination
          size="small"
          className={styles.pages}
          current={page}
          pageSize={limit}
          total={data.total}
          showSizeChanger={false}
          showTotal={(total, [from, to]) => `${count(from)}–${count(to)} of ${count(total)}`}
          onChange={setPage}
        />
      )}
    </>
  );
}
