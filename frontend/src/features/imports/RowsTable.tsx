import type { ImportRow } from '../../api/imports';
import { Table } from '../../components/Table';
import { grouped } from '../../components/countOf';
import type { ListView } from './listView';
import styles from './RowsTable.module.css';

interface RowsTableProps {
  view: ListView;
  rows: readonly ImportRow[];
}

/** Rows that are accepted: what each changes, field by field, and what is doubtful in it. */
export function RowsTable({ view, rows }: RowsTableProps) {
  return (
    <Table className={styles.table}>
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
            <td className={styles.line}>{grouped(row.line)}</td>
            <td>
              <strong>{row.partNumber}</strong> <span className={styles.maker}>{row.manufacturer}</span>
              {row.supplier !== null && <span className={styles.supplier}>{row.supplier}</span>}
            </td>
            <td>
              <Changes view={view} row={row} />
            </td>
            <td className={styles.doubt}>
              {row.doubts.map(({ message }) => (
                <span key={message}>{message}</span>
              ))}
            </td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}

/** They stand in a column of their own. */
const NAMES = ['manufacturer', 'partNumber'];

interface ChangesProps {
  view: ListView;
  row: ImportRow;
}

function Changes({ view, row: { changes, state } }: ChangesProps) {
  if (changes.length === 0 && state === 'unchanged') return <span className={styles.maker}>nothing</span>;
  return changes.map((change) => {
    const { label, old, next } = view.changeWords(change);
    if (change.old === null && state !== 'changed')
      return NAMES.includes(change.field) ? null : (
        <span key={change.field} className={styles.kept}>
          {label} <ins>{next}</ins>
        </span>
      );
    return (
      <span key={change.field} className={styles.change}>
        {label} <del aria-label={`was ${old}`}>{old}</del> <ins>{next}</ins>
      </span>
    );
  });
}
