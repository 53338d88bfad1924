import { useInfiniteQuery } from '@tanstack/react-query';
import { Button, Skeleton } from 'antd';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { detailOf } from '../../api/problem';
import type { PagesQuery } from '../../api/pages';
import type { ExcludedPart } from '../../api/ranking';
import { FieldMessage } from '../../components/FieldMessage';
import { Table } from '../../components/Table';
import styles from './Exclusions.module.css';
import { leftOutText, reasonsText, type Excluded } from './exclusionWords';

interface ExcludedPage<Reason extends string> {
  items: ExcludedPart<Reason>[];
  total: number;
}

interface ExclusionsProps<Reason extends string> {
  /** Asks for the parts that are left out. */
  query: PagesQuery<ExcludedPage<Reason>>;
  excluded: Excluded<Reason>;
  /** The reasons in a few words. */
  labels: Record<Reason, string>;
  /** Where the parts' pages stand. */
  path: string;
}

/** How many parts are left out and why; folds out to the parts themselves. */
export function Exclusions<Reason extends string>({ excluded, ...parts }: ExclusionsProps<Reason>) {
  const [open, setOpen] = useState(false);
  if (excluded.total === 0) return <p className={styles.summary}>No part is left out.</p>;
  return (
    <>
      <p className={styles.summary}>
        <button
          type="button"
          id="exclusions"
          className={styles.unfold}
          aria-expanded={open}
          aria-controls="excluded-parts"
          onClick={() => setOpen(!open)}
        >
          {leftOutText(excluded)}
        </button>
        : {reasonsText(excluded, parts.labels)}
      </p>
      {open && <ExcludedParts {...parts} />}
    </>
  );
}

function ExcludedParts<Reason extends string>({
  query,
  labels,
  path,
}: Omit<ExclusionsProps<Reason>, 'excluded'>) {
  const { data, error, hasNextPage, isFetchingNextPage, fetchNextPage } = useInfiniteQuery(query);
  if (error) return <FieldMessage>{detailOf(error)}</FieldMessage>;
  if (!data) return <Skeleton title={false} paragraph={{ rows: 4 }} />;
  const parts = data.pages.flatMap(({ items }) => items);
  return (
    <div id="excluded-parts" className={styles.parts} tabIndex={0} role="region" aria-label="Parts left out">
      <Table>
        <tbody>
          {parts.map((excluded) => (
            <ExcludedRow
              key={excluded.part.id}
              excluded={excluded}
              label={labels[excluded.reason]}
              path={path}
            />
          ))}
        </tbody>
      </Table>
      {hasNextPage && (
        <Button size="small" loading={isFetchingNextPage} onClick={() => void fetchNextPage()}>
          Show more of {data.pages[0].total}
        </Button>
      )}
    </div>
  );
}

interface ExcludedRowProps {
  excluded: ExcludedPart;
  label: string;
  path: string;
}

function ExcludedRow({ excluded: { part, detail }, label, path }: ExcludedRowProps) {
  return (
    <tr>
      <th scope="row">
        <Link to={`${path}/${part.id}`}>{part.partNumber}</Link>{' '}
        <span className={styles.maker}>{part.manufacturer}</span>
      </th>
      <td>
        <span className="visually-hidden">{label}: </span>
        {detail}
      </td>
    </tr>
  );
}
