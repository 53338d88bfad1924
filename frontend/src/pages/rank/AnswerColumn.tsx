import type { ReactNode } from 'react';
import type { View } from '../../features/conditions/search/searchKeys';
import { ViewSwitch } from '../../features/conditions/search/ViewSwitch';
import { AnswerBlock, type AnswerWords } from '../../features/ranking/AnswerBlock';
import { GridSkeleton } from '../../features/ranking/GridSkeleton';
import styles from './RankPage.module.css';
import { ShortcutsButton } from './Shortcuts';

interface AnswerColumnProps {
  view: View;
  onView: (view: View) => void;
  words: AnswerWords | undefined;
  note: string | null;
  /** The ranking below the answer. */
  children: ReactNode;
}

/** The answer in words, the ranking that it comes from, and what to keep in mind. */
export function AnswerColumn({ view, onView, words, note, children }: AnswerColumnProps) {
  return (
    <section
      id="answer"
      aria-label="Answer"
      className={view === 'resistors' ? `${styles.ranking} ${styles.wide}` : styles.ranking}
    >
      <ViewSwitch view={view} onChange={onView} />
      <AnswerBlock words={words} stale={note} />
      {children}
      {!words && note === null && <GridSkeleton />}
      <p className={styles.caution}>
        Figures are estimates from typical data: verify on the bench and against the data sheet’s limits.
        Where a fault can hurt someone, noise is not the selection criterion: follow the applicable standards,
        local codes and a licensed engineer’s judgement. <ShortcutsButton />
      </p>
    </section>
  );
}
