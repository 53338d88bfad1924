import type { StoredPart } from '../../api/parts';
import type { KindOfPart } from './kindOfPart';
import { optionLabel } from '../../components/optionLabels';
import { figuresOf } from './partDraft';
import styles from './PartTitle.module.css';

/** What a part is called, whose it is and how it stands. */
export function PartTitle({ kind, part }: { kind: KindOfPart; part: StoredPart }) {
  const facts = [
    ...kind.summary(figuresOf(kind.catalogue, part)),
    part.package,
    optionLabel('lifecycle', part.lifecycle),
    optionLabel('approval', part.approval),
    part.library === 'curated' ? 'curated library, read-only' : 'your own library',
  ];
  return (
    <div className={styles.title}>
      <h1>
        {part.partNumber} <span className={styles.maker}>{part.manufacturer}</span>
      </h1>
      <p className={styles.facts}>{facts.filter(Boolean).join(' · ')}</p>
      {part.description !== '' && <p className={styles.description}>{part.description}</p>}
    </div>
  );
}
