import { DUPLICATE_LABELS, likelihoodWords } from '@roothertz/common/parts';
import { Button } from 'antd';
import type { Duplicate } from '../../../api/parts';
import { FieldMessage } from '../../../components/FieldMessage';
import { useMayDo } from '../../../components/useMember';
import type { KindOfPart } from '../kindOfPart';
import { draftOf } from '../partDraft';
import { partValues } from '../partValues';
import { refusedWords } from '../standing/refusedWords';
import { useChangeStandings } from '../standing/useChangeStandings';
import { Table } from '../../../components/Table';
import { DuplicatePart } from './DuplicatePart';
import styles from './Duplicates.module.css';
import { useKeepBoth } from './useKeepBoth';

interface DuplicatePairProps {
  kind: KindOfPart;
  pair: Duplicate;
}

/** Two parts side by side: why they may be one, what differs, and what can be done. */
export function DuplicatePair({ kind, pair }: DuplicatePairProps) {
  const { one, other, likelihood, reasons } = pair;
  const mayEdit = useMayDo('parts.edit');
  const keep = useKeepBoth(pair);
  const standings = useChangeStandings(kind);
  const error = keep.error ?? standings.error;
  const [left, right] = [one, other].map((part) => draftOf(kind.catalogue, part));
  const differences = partValues(kind.catalogue).filter(({ textOf }) => textOf(left) !== textOf(right));
  return (
    <article className={styles.pair} aria-label={`${one.partNumber} and ${other.partNumber}`}>
      <p className={styles.why}>
        <span>
          <strong>{likelihoodWords(likelihood)} one part</strong>:{' '}
          {reasons.map((reason) => DUPLICATE_LABELS[reason]).join('; ')}
        </span>
        {mayEdit && (
          <Button size="small" loading={keep.isPending} onClick={() => keep.mutate()}>
            Keep both
          </Button>
        )}
      </p>
      {error && <FieldMessage>{refusedWords(error)}</FieldMessage>}
      <div className={styles.scroll}>
        <Table className={styles.table}>
          <thead>
            <tr>
              <td />
              {[one, other].map((part) => (
                <th key={part.id} scope="col">
                  <DuplicatePart
                    kind={kind}
                    part={part}
                    onRetire={mayEdit && part.library === 'team' ? standings.mutate : null}
                  />
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {differences.map(({ path, label, textOf }) => (
              <tr key={path.join('.')}>
                <th scope="row">{label}</th>
                <td>{textOf(left)}</td>
                <td>{textOf(right)}</td>
              </tr>
            ))}
          </tbody>
        </Table>
      </div>
      {differences.length === 0 && <p className={styles.quiet}>Nothing differs.</p>}
    </article>
  );
}
