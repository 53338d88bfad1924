import { unbroken } from '../../features/ranking/answer';
import type { AnswerWords } from '../../features/ranking/AnswerBlock';
import styles from './RankPage.module.css';

/** On narrow screens: the answer in a line that stays in sight while the conditions are changed. */
export function BriefAnswer({ words }: { words: AnswerWords | undefined }) {
  const figure = words?.lead.find(({ strong }) => strong);
  if (!figure) return null;
  return (
    <a href="#answer" className={styles.brief}>
      {unbroken(figure.text)}
    </a>
  );
}
