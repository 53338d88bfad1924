import { Button } from 'antd';
import { useState } from 'react';
import type { Import } from '../../api/imports';
import { FieldMessage } from '../../components/FieldMessage';
import { Table } from '../../components/Table';
import { grouped } from '../../components/countOf';
import { KINDS } from './kinds';
import { faultsByColumn, isStatedByColumn, withColumn } from './mappingDraft';
import { MappingRow } from './MappingRow';
import styles from './MappingTable.module.css';
import type { ImportMapping } from './useMapping';
import { WholeListFields } from './WholeListFields';

interface MappingTableProps {
  imported: Import;
  mapping: ImportMapping;
  canChange: boolean;
}

const MOST_AT_FIRST = 60;

/** What each column of the file is, with the first cells under its heading. */
export function MappingTable({ imported, mapping, canChange }: MappingTableProps) {
  const { kind, columns } = imported;
  const { view } = KINDS[kind];
  const [isWhole, setWhole] = useState(false);
  const faults = faultsByColumn(mapping.mapping, mapping.errors);
  const fault = faults.get(null);
  const shown = isWhole ? columns : columns.slice(0, MOST_AT_FIRST);
  return (
    <section className={styles.mapping} aria-label="What each column is">
      {kind === 'prices' && (
        <WholeListFields
          {...{ canChange, wholeList: mapping.wholeList, errors: mapping.errors }}
          has={(field) => isStatedByColumn(mapping.mapping, field)}
          onChange={mapping.changeWholeList}
        />
      )}
      <h2>What each column is</h2>
      {fault !== undefined && <FieldMessage>{fault}</FieldMessage>}
      <Table className={styles.table}>
        <thead>
          <tr>
            <th scope="col">column in the file</th>
            <th scope="col">becomes</th>
            <th scope="col">unit</th>
          </tr>
        </thead>
        <tbody>
          {shown.map((column) => (
            <MappingRow
              key={column.column}
              {...{ view, column, canChange }}
              mapping={mapping.mapping}
              fault={faults.get(column.column)}
              onChange={(next) => mapping.change(withColumn(mapping.mapping, column.column, next))}
            />
          ))}
        </tbody>
      </Table>
      {shown.length < columns.length && (
        <Button type="link" onClick={() => setWhole(true)}>
          Show all {grouped(columns.length)} columns
        </Button>
      )}
    </section>
  );
}
