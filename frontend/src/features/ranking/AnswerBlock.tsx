import { Skeleton } from 'antd';
import { plainText, unbroken, type Piece } from './answer';
import styles from './Answer.module.css';

/** An answer in words: the sentence on top, and what follows from it. */
export interface AnswerWords {
  lead: Piece[];
  following: string;
}

interface AnswerBlockProps {
  words: AnswerWords | undefined;
  /** Why this isn't the answer to the conditions that stand on the page; null = it is. */
  stale: string | null;
}

/** A ranking's answer as a sentence in figures, read out when it changes. */
export function AnswerBlock({ words, stale }: AnswerBlockProps) {
  return (
    <div className={styles.answer}>
      <div aria-live="polite" aria-atomic="true" className="visually-hidden">
        {stale ?? (words ? plainText(words.lead) : '')}
      </div>
      <div aria-hidden={stale !== null} className={stale ? styles.stale : undefined}>
        {words && <Sentences {...words} />}
        {!words && stale === null && <AnswerSkeleton />}
      </div>
      {stale && <p className={styles.note}>{stale}</p>}
    </div>
  );
}

function Sentences({ lead, following }: AnswerWords) {
  return (
    <>
      <h1 className={styles.lead}>
        {lead.map(({ text, strong }) =>
          strong ? <strong key={text}>{unbroken(text)}</strong> : <span key={text}>{unbroken(text)}</span>,
        )}
      </h1>
      <p className={styles.following}>{unbroken(following)}</p>
    </>
  );
}

function AnswerSkeleton() {
  return <Skeleton title={{ width: '90%' }} paragraph={{ rows: 1, width: '70%' }} />;
}
