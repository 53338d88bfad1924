import type { RankingRequest } from '@roothertz/common/conditions';
import { Tooltip } from 'antd';
import { useId } from 'react';
import styles from './Levers.module.css';
import type { LeverAct, LeverRow } from './leverRows';

interface LeverItemProps {
  row: LeverRow;
  onTry: (request: RankingRequest) => void;
  onSelect: (partId: string) => void;
}

const HINTS: Record<LeverAct['kind'], string> = {
  try: 'Click to try it; the browser’s back undoes it.',
  select: 'Click to look at it.',
  none: '',
};

/** One lever with its sentence on hover, on focus and for screen readers. */
export function LeverItem({ row: { label, change, helps, sentence, act }, onTry, onSelect }: LeverItemProps) {
  const sentenceId = useId();
  const text = `${sentence} ${HINTS[act.kind]}`.trim();
  const onClick = () => {
    if (act.kind === 'try') onTry(act.request);
    if (act.kind === 'select') onSelect(act.partId);
  };
  return (
    <li>
      <Tooltip title={text} placement="left" trigger={['hover', 'focus']} mouseEnterDelay={0.3}>
        <button
          type="button"
          className={styles.lever}
          data-helps={helps}
          data-informs={act.kind === 'none'}
          aria-disabled={act.kind === 'none'}
          aria-describedby={sentenceId}
          onClick={onClick}
        >
          <span className={styles.label}>{label}</span>
          <span className={styles.change}>{change}</span>
        </button>
      </Tooltip>
      <span id={sentenceId} hidden>
        {text}
      </span>
    </li>
  );
}
