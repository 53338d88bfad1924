import type { RankingRequest } from '@roothertz/common/conditions';
import { EXCLUSION_LABELS } from '@roothertz/common/noise';
import { useInfiniteQuery } from '@tanstack/react-query';
import { Button, Skeleton } from 'antd';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { detailOf } from '../../api/problem';
import { exclusionsQuery, type ExcludedPart, type Ranking } from '../../api/ranking';
import { FieldMessage } from '../../components/FieldMessage';
import styles from './Exclusions.module.css';
import { leftOutText, reasonsText } from './exclusionWords';

interface ExclusionsProps {
  request: RankingRequest;
  excluded: Ranking['excluded'];
}

/** How many parts are left out and why; folds out to the parts themselves. */
export function Exclusions({ request, excluded }: ExclusionsProps) {
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
        : {reasonsText(excluded)}
      </p>
      {open && <ExcludedParts request={request} />}
    </>
  );
}

function ExcludedParts({ request }: { request: RankingRequest }) {
  const { data, error, hasNextPage, isFetchingNextPage, fetchNextPage } = useInfiniteQuery(
    exclusionsQuery(request),
  );
  if (error) return <FieldMessage>{detailOf(error)}</FieldMessage>;
  if (!data) return <Skeleton title={false} paragraph={{ rows: 4 }} />;
  const parts = data.pages.flatMap(({ items }) => items);
  return (
    <div id="excluded-parts" className={styles.parts} tabIndex={0} role="region" aria-label="Parts left out">
      <table>
        <tbody>
          {parts.map((excluded) => (
            <ExcludedRow key={excluded.part.id} excluded={excluded} />
          ))}
        </tbody>
      </table>
      {hasNextPage && (
        <Button size="small" loading={isFetchingNextPage} onClick={() => void fetchNextPage()}>
          Show more of {data.pages[0].total}
        </Button>
      )}
    </div>
  );
}

function ExcludedRow({ excluded: { part, reason, detail } }: { excluded: ExcludedPart }) {
  return (
    <tr>
      <th scope="row">
        <Link to={`/parts/${part.id}`}>{part.partNumber}</Link>{' '}
        <span className={styles.maker}>{part.manufacturer}</span>
      </th>
      <td>
        <span className="visually-hidden">{EXCLUSION_LABELS[reason]}: </span>
        {detail}
      </td>
    </tr>
  );
}
