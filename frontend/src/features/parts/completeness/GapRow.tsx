import { completenessOf, gapsOf } from '@roothertz/common/parts';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import type { StoredPart } from '../../../api/parts';
import { FieldMessage } from '../../../components/FieldMessage';
import { useMayDo } from '../../../components/useMember';
import type { KindOfPart } from '../kindOfPart';
import { figuresOf } from '../partDraft';
import { refusedWords } from '../standing/refusedWords';
import styles from './Completeness.module.css';
import { GapItem } from './GapItem';
import { useFillGap } from './useFillGap';

interface GapRowProps {
  kind: KindOfPart;
  part: StoredPart;
  /** Parameters whose fields are open in every row. */
  asked: readonly string[];
}

/** A part, how complete it is, and what it lacked when it was listed. */
export function GapRow({ kind, part, asked }: GapRowProps) {
  const figures = figuresOf(kind.catalogue, part);
  const [gaps] = useState(() => gapsOf(kind.catalogue, figures));
  const [opened, setOpened] = useState<readonly string[]>([]);
  const mayEdit = useMayDo('parts.edit') && part.library === 'team';
  const { mutate, error } = useFillGap(kind);
  const percent = Math.floor(completenessOf(kind.catalogue, figures) * 100);
  return (
    <tr>
      <th scope="row">
        <Link to={`${kind.path}/${part.id}`}>{part.partNumber}</Link>{' '}
        <span className={styles.maker}>{part.manufacturer}</span>
      </th>
      <td className={styles.share}>
        <span className={styles.bar} aria-hidden="true">
          <span className={styles.known} style={{ width: `${percent}%` }} />
        </span>
        {percent}&thinsp;%
      </td>
      <td>
        <div className={styles.gaps}>
          {gaps.length === 0 && <span className={styles.maker}>nothing</span>}
          {gaps.map((gap) => (
            <GapItem
              key={gap.key}
              kind={kind}
              part={part}
              gap={gap}
              isAsked={asked.includes(gap.key)}
              isOpen={opened.includes(gap.key)}
              onOpen={mayEdit ? () => setOpened([...opened, gap.key]) : null}
              onFill={(value) => mutate({ part, key: gap.key, label: gap.label, value })}
            />
          ))}
        </div>
        {error && <FieldMessage>{refusedWords(error)}</FieldMessage>}
      </td>
    </tr>
  );
}
