import type { ListedFields } from '@roothertz/common/parts';
import type { ImportRow } from '../../api/imports';
import { changeWords } from './changeWords';
import { count } from './importWords';
import styles from './RowsTable.module.css';

interface RowsTableProps {
  catalogue: ListedFields;
  rows: readonly ImportRow[];
}

/** Rows that are accepted: what each changes, field by field, and what is doubtful in it. */
export function RowsTable({ catalogue, rows }: RowsTableProps) {
  return (
    <table className={styles.table}>
      <thead>
        <tr>
          <th scope="col">line</th>
          <th scope="col">part</th>
          <th scope="col">what changes</th>
          <th scope="col">remark</th>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={row.line}>
            <td className={styles.line}>{count(row.line)}</td>
            <td>
              <strong>{row.partNumber}</strong> <span className={styles.maker}>{row.manufacturer}</span>
            </td>
            <td>
              <Changes catalogue={catalogue} row={row} />
            </td>
            <td className={styles.doubt}>
              {row.doubts.map(({ message }) => (
                <span key={message}>{message}</span>
              ))}
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function Changes({ catalogue, row: { changes, state } }: { catalogue: ListedFields; row: ImportRow }) {
  if (changes.length === 0)
    return <span className={styles.maker}>{state === 'unchanged' ? 'nothing' : 'new part'}</span>;
  return changes.map((change) => {
    const { label, old, next } = changeWords(catalogue, change);
    return (
      <span key={change.field} className={styles.change}>
        {label} <del aria-label={`was ${old}`}>{old}</del> <ins>{next}</ins>
      </span>
    );
  });
}
