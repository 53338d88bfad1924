import { Skeleton } from 'antd';
import { followingSentences, leadSentence, plainText } from './answer';
import styles from './Answer.module.css';
import { emptyAdvice } from './exclusionWords';
import type { ShownRanking } from './useRanking';

interface AnswerProps {
  ranking: ShownRanking | undefined;
  /** Why this isn't the answer to the conditions that stand on the page; null = it is. */
  stale: string | null;
}

/** The ranking's answer as a sentence in figures, read out when it changes. */
export function Answer({ ranking, stale }: AnswerProps) {
  return (
    <div className={styles.answer}>
      <div aria-live="polite" aria-atomic="true" className="visually-hidden">
        {stale ?? (ranking ? spoken(ranking) : '')}
      </div>
      <div aria-hidden={stale !== null} className={stale ? styles.stale : undefined}>
        {ranking && <Sentences ranking={ranking} />}
        {!ranking && stale === null && <AnswerSkeleton />}
      </div>
      {stale && <p className={styles.note}>{stale}</p>}
    </div>
  );
}

function Sentences({ ranking }: { ranking: ShownRanking }) {
  const { first, items, request } = ranking;
  if (items.length === 0)
    return (
      <>
        <h1>No part is ranked.</h1>
        <p className={styles.following}>{emptyAdvice(first.excluded, request.filter?.search)}</p>
      </>
    );
  return (
    <>
      <h1 className={styles.lead}>
        {leadSentence(items[0], request).map(({ text, strong }) =>
          strong ? <strong key={text}>{text}</strong> : <span key={text}>{text}</span>,
        )}
      </h1>
      <p className={styles.following}>{followingSentences(first, items, request)}</p>
    </>
  );
}

function AnswerSkeleton() {
  return <Skeleton title={{ width: '90%' }} paragraph={{ rows: 1, width: '70%' }} />;
}

function spoken({ items, request }: ShownRanking): string {
  return items.length === 0 ? 'No part is ranked.' : plainText(leadSentence(items[0], request));
}
