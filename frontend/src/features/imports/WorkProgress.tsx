import { Button, Progress } from 'antd';
import type { ImportSummary } from '../../api/imports';
import { grouped } from '../../components/countOf';
import { timeLeft } from './importWords';
import styles from './WorkProgress.module.css';

interface WorkProgressProps {
  imported: ImportSummary;
  /** Left out = the member can't stop it. */
  onCancel?: () => void;
  isCancelling: boolean;
}

const WORDS: Partial<Record<ImportSummary['state'], string>> = {
  checking: 'Checking the rows',
  waiting: 'Waiting until another import is through',
  applying: 'Writing the rows: all of them or none',
  undoing: 'Bringing back what stood there before',
};

/** How far the work on an import is, at which rate, and how long it still takes. */
export function WorkProgress({ imported, onCancel, isCancelling }: WorkProgressProps) {
  const { state, progress } = imported;
  const { done = 0, total = 0 } = progress ?? {};
  const words = WORDS[state] ?? 'At work';
  const percent = total === 0 ? 0 : Math.min(100, Math.round((100 * done) / total));
  return (
    <section className={styles.progress} aria-label="Progress">
      <p role="status">{words}</p>
      <Progress percent={percent} showInfo={false} aria-label={words} />
      <p className={styles.figures}>
        {[`${grouped(done)} of ${grouped(total)} rows`, ...pace(progress)].join(' · ')}
      </p>
      {onCancel && (
        <Button onClick={onCancel} loading={isCancelling}>
          Cancel
        </Button>
      )}
    </section>
  );
}

function pace(progress: ImportSummary['progress']): string[] {
  const { rowsPerSecond = null, secondsLeft = null } = progress ?? {};
  return [
    ...(rowsPerSecond === null ? [] : [`${grouped(Math.round(rowsPerSecond))} rows/s`]),
    ...(secondsLeft === null ? [] : [timeLeft(secondsLeft)]),
  ];
}
