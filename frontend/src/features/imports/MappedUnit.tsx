import type { ColumnMapping } from '@roothertz/common/imports';
import { Select } from 'antd';
import type { ListView } from './listView';
import styles from './MappingTable.module.css';

interface MappedUnitProps {
  view: ListView;
  heading: string;
  mapped: ColumnMapping;
  canChange: boolean;
  onChange: (next: ColumnMapping) => void;
}

/** The unit of the figures whose cells state none. */
export function MappedUnit({ view, heading, mapped, canChange, onChange }: MappedUnitProps) {
  const options = view.units(mapped);
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
      showSearch={options.length > 20 && { optionFilterProp: 'label' }}
      onChange={(unit) => onChange({ ...mapped, unit: unit || null })}
    />
  );
}
