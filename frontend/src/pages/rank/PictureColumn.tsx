import type { RankingRequest, StageConditions } from '@roothertz/common/conditions';
import { Skeleton } from 'antd';
import { Levers } from '../../features/ranking/levers/Levers';
import { PartBudget } from '../../features/ranking/PartBudget';
import { PartCautions } from '../../features/ranking/PartCautions';
import { Picture } from '../../features/ranking/Picture';
import { StageParts } from '../../features/ranking/stages/StageParts';
import styles from './RankPage.module.css';
import type { LookedAt } from './useLookedAt';

interface PictureColumnProps {
  lookedAt: LookedAt | null;
  isAwaited: boolean;
  onChange: (request: RankingRequest) => void;
  onSelect: (partId: string) => void;
  /** Takes the network of a whole stage into the schematic. */
  onTake: (single: StageConditions) => void;
}

/** The selected part: its picture, what its noise is made of, and what else would help. */
export function PictureColumn({ lookedAt, isAwaited, ...acts }: PictureColumnProps) {
  return (
    <section aria-label="Picture of the selected part" className={styles.picture}>
      {lookedAt && <Details lookedAt={lookedAt} {...acts} />}
      {isAwaited && <Skeleton title={{ width: 160 }} paragraph={{ rows: 10 }} />}
    </section>
  );
}

interface DetailsProps extends Pick<PictureColumnProps, 'onChange' | 'onSelect' | 'onTake'> {
  lookedAt: LookedAt;
}

function Details({ lookedAt, onChange, onSelect, onTake }: DetailsProps) {
  const { selected, request, stage, prices, chosen, quieter, pulled, changed } = lookedAt;
  const take = (next: RankingRequest) => onChange(changed(next));
  return (
    <>
      <Picture
        selected={selected}
        request={request}
        onMove={take}
        prices={prices}
        chosen={chosen}
        onSelect={onSelect}
      />
      {stage && (
        <StageParts
          stage={stage.whole}
          quantity={prices.quantity}
          onTake={stage.hasNetwork ? () => onTake(stage.single) : null}
        />
      )}
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
