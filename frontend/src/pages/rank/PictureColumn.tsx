import { Skeleton } from 'antd';
import { PartBudget } from '../../features/ranking/PartBudget';
import { Picture } from '../../features/ranking/Picture';
import type { ShownRanking } from '../../features/ranking/useRanking';
import type { SelectedPart } from '../../features/ranking/useSelectedPart';
import styles from './RankPage.module.css';

interface PictureColumnProps {
  ranking: ShownRanking | undefined;
  selected: SelectedPart | null;
  isAwaited: boolean;
}

export function PictureColumn({ ranking, selected, isAwaited }: PictureColumnProps) {
  return (
    <section aria-label="Picture of the selected part" className={styles.picture}>
      {ranking && selected && (
        <>
          <Picture selected={selected} request={ranking.request} />
          <PartBudget selected={selected} request={ranking.request} />
        </>
      )}
      {isAwaited && <Skeleton title={{ width: 160 }} paragraph={{ rows: 10 }} />}
    </section>
  );
}
