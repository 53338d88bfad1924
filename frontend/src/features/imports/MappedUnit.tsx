import type { ColumnMapping } from '@roothertz/common/imports';
import type { ListedFields } from '@roothertz/common/parts';
import { Select } from 'antd';
import { unitChoices } from './fieldChoices';
import styles from './MappingTable.module.css';

interface MappedUnitProps {
  catalogue: ListedFields;
  heading: string;
  mapped: ColumnMapping;
  canChange: boolean;
  onChange: (next: ColumnMapping) => void;
}

/** The unit of the figures whose cells state none. */
export function MappedUnit({ catalogue, heading, mapped, canChange, onChange }: MappedUnitProps) {
  const parameter = catalogue.parameters.find(({ key }) => key === mapped.field);
  if (parameter === undefined || mapped.form === 'origin') return null;
  const kind = mapped.form === 'peak-to-peak' ? 'voltage' : parameter.kind;
  const options = unitChoices(kind, mapped.unit);
  if (options.length === 0) return null;
  if (!canChange) return mapped.unit;
  return (
    <Select<string>
      variant="borderless"
      suffixIcon={null}
      className={styles.unit}
      popupMatchSelectWidth={false}
      aria-label={`Unit of ${heading}`}
      placeholder="none"
      options={options}
      value={mapped.unit}
      onChange={(unit) => onChange({ ...mapped, unit })}
    />
  );
}
