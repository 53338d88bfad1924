import { leadSentence } from '../../features/ranking/answer';
import type { ShownRanking } from '../../features/ranking/useRanking';
import styles from './RankPage.module.css';

/** On narrow screens: the answer in a line that stays in sight while the conditions are changed. */
export function BriefAnswer({ ranking }: { ranking: ShownRanking | undefined }) {
  const leader = ranking?.items[0];
  if (!ranking || !leader) return null;
  return (
    <a href="#answer" className={styles.brief}>
      {leadSentence(leader, ranking.request)[1].text}
    </a>
  );
}
