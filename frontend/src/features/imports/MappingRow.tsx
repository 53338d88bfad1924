import type { ColumnMapping } from '@roothertz/common/imports';
import { Select } from 'antd';
import type { ImportColumn } from '../../api/imports';
import { FieldMessage } from '../../components/FieldMessage';
import { BreakQuantity } from './BreakQuantity';
import { becomesWords, type FieldChoice, type FieldChoices, type ListView } from './listView';
import { type Becomes, becomesOf, columnAs, type Mapping } from './mappingDraft';
import { doubtOf, notesOf } from './mappingNotes';
import styles from './MappingTable.module.css';
import { MappedUnit } from './MappedUnit';
import { SpotFrequency } from './SpotFrequency';

interface MappingRowProps {
  view: ListView;
  column: ImportColumn;
  mapping: Mapping;
  canChange: boolean;
  fault: string | undefined;
  onChange: (next: ColumnMapping | null) => void;
}

export function MappingRow(props: MappingRowProps) {
  const { view, column, mapping, canChange, fault, onChange } = props;
  const heading = column.heading || `column ${column.column + 1}`;
  const mapped = mapping.find((one) => one.column === column.column);
  const doubt = doubtOf(column, mapped);
  return (
    <tr>
      <th scope="row">
        {heading}
        <span className={styles.samples}>
          {column.samples.slice(0, 3).join(' · ') || 'no cell is filled'}
        </span>
      </th>
      <td>
        <span className={styles.becomes}>
          {canChange ? (
            <Select<Becomes, FieldChoices[number] & Partial<FieldChoice>>
              variant="borderless"
              suffixIcon={null}
              className={mapped ? styles.choice : styles.leftOut}
              popupMatchSelectWidth={false}
              showSearch={{ optionFilterProp: 'label' }}
              aria-label={`${heading} becomes`}
              options={[...view.choices]}
              value={becomesOf(mapped)}
              onChange={(becomes) => onChange(columnAs(view, column, becomes))}
            />
          ) : (
            <span className={mapped ? styles.fixed : styles.none}>
              {becomesWords(view.choices, becomesOf(mapped))}
            </span>
          )}
          {doubt && (
            <abbr className={styles.doubt} title={doubt}>
              ?
            </abbr>
          )}
        </span>
        {mapped?.form === 'spot' && <SpotFrequency {...{ heading, mapped, canChange, onChange }} />}
        {mapped?.form === 'break' && <BreakQuantity {...{ heading, mapped, canChange, onChange }} />}
        {mapped && <Notes lines={notesOf(column, mapped, mapping)} />}
        {fault !== undefined && <FieldMessage>{fault}</FieldMessage>}
      </td>
      <td>{mapped && <MappedUnit {...{ view, heading, mapped, canChange, onChange }} />}</td>
    </tr>
  );
}

function Notes({ lines }: { lines: readonly string[] }) {
  return lines.map((line) => (
    <span key={line} className={styles.note}>
      {line}
    </span>
  ));
}
