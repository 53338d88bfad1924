import { ROW_STATES } from '@roothertz/common/imports';
import { Button } from 'antd';
import { Link } from 'react-router-dom';
import { type ImportSummary, isRunning } from '../../api/imports';
import { detailOf } from '../../api/problem';
import { FieldMessage } from '../../components/FieldMessage';
import { useMayDo } from '../../components/useMember';
import styles from './History.module.css';
import { moment } from '../../components/moments';
import { grouped } from '../../components/countOf';
import { rows, stateWords } from './importWords';
import { KINDS } from './kinds';
import { useImportActs } from './useImportActs';

interface HistoryRowProps {
  imported: ImportSummary;
}

export function HistoryRow({ imported }: HistoryRowProps) {
  const { id, kind, fileName, rowCount, counts, createdAt, createdBy, state } = imported;
  const mayEdit = useMayDo(KINDS[kind].action);
  const { undo } = useImportActs(id);
  return (
    <tr>
      <th scope="row">
        <Link to={`/imports/${id}`}>{fileName}</Link>
        <span className={styles.note}>
          {KINDS[kind].title}, {rows(rowCount)}
        </span>
      </th>
      <td>
        {createdBy?.name ?? 'a former member'}
        <span className={styles.note}>{moment(createdAt)}</span>
      </td>
      {ROW_STATES.map((one) => (
        <td key={one} className={styles.count} data-label={one}>
          {counts === null ? '–' : grouped(counts[one])}
        </td>
      ))}
      <td>
        {stateWords(state)}
        <span className={styles.note}>{outcomeNote(imported)}</span>
      </td>
      <td>
        {mayEdit && state === 'applied' && (
          <Button
            size="small"
            aria-label={`Undo ${fileName}`}
            loading={undo.isPending}
            onClick={() => undo.mutate()}
          >
            Undo
          </Button>
        )}
        {undo.error && <FieldMessage>{detailOf(undo.error)}</FieldMessage>}
      </td>
    </tr>
  );
}

function outcomeNote(imported: ImportSummary): string {
  const { state, progress, appliedAt, appliedBy, undoneAt, undoneBy, keptCount } = imported;
  if (isRunning(imported))
    return progress === null ? '' : `${grouped(progress.done)} of ${grouped(progress.total)} rows`;
  if (state === 'applied') return `by ${appliedBy?.name ?? 'a former member'}, ${moment(appliedAt!)}`;
  if (state !== 'undone') return '';
  const kept = keptCount === 0 ? '' : `; ${rows(keptCount)} kept`;
  return `by ${undoneBy?.name ?? 'a former member'}, ${moment(undoneAt!)}${kept}`;
}
