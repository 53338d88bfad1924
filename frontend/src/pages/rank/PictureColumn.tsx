import type { RankingRequest } from '@roothertz/common/conditions';
import { Skeleton } from 'antd';
import { Levers } from '../../features/ranking/levers/Levers';
import { PartBudget } from '../../features/ranking/PartBudget';
import { PartCautions } from '../../features/ranking/PartCautions';
import { Picture } from '../../features/ranking/Picture';
import styles from './RankPage.module.css';
import type { LookedAt } from './useLookedAt';

interface PictureColumnProps {
  lookedAt: LookedAt | null;
  isAwaited: boolean;
  onChange: (request: RankingRequest) => void;
  onSelect: (partId: string) => void;
}

/** The selected part: its picture, what its noise is made of, and what else would help. */
export function PictureColumn({ lookedAt, isAwaited, onChange, onSelect }: PictureColumnProps) {
  return (
    <section aria-label="Picture of the selected part" className={styles.picture}>
      {lookedAt && <Details lookedAt={lookedAt} onChange={onChange} onSelect={onSelect} />}
      {isAwaited && <Skeleton title={{ width: 160 }} paragraph={{ rows: 10 }} />}
    </section>
  );
}

interface DetailsProps extends Pick<PictureColumnProps, 'onChange' | 'onSelect'> {
  lookedAt: LookedAt;
}

function Details({ lookedAt, onChange, onSelect }: DetailsProps) {
  const { selected, request, quieter, pulled, changed } = lookedAt;
  const take = (next: RankingRequest) => onChange(changed(next));
  return (
    <>
      <Picture selected={selected} request={request} onMove={take} />
      <PartBudget selected={selected} request={request} />
      <Levers
        selected={selected}
        request={request}
        quieter={quieter}
        pulled={pulled}
        onTry={take}
        onSelect={onSelect}
      />
      <PartCautions cautions={selected.figures.cautions} />
    </>
  );
}
