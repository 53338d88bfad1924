import type { ImportRow } from '../../api/imports';
import { Table } from '../../components/Table';
import { grouped } from '../../components/countOf';
import styles from './RowsTable.module.css';

/** Rows that are refused: at which column, for which value, why. */
export function RefusedTable({ rows }: { rows: readonly ImportRow[] }) {
  const errors = rows.flatMap((row) => row.errors.map((error) => ({ ...error, line: row.line })));
  return (
    <Table className={styles.table}>
      <thead>
        <tr>
          <th scope="col">line</th>
          <th scope="col">column</th>
          <th scope="col">value</th>
          <th scope="col">why</th>
        </tr>
      </thead>
      <tbody>
        {errors.map(({ line, column, value, why, expected }, index) => (
          <tr key={index}>
            <td className={styles.line}>{grouped(line)}</td>
            <td>{column ?? '–'}</td>
            <td className={styles.value}>{value || <span className={styles.maker}>empty</span>}</td>
            <td>
              <span className={styles.why}>{why}</span>
              {expected !== '' && <span className={styles.expected}>expected: {expected}</span>}
            </td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}
