import { Input, Select } from 'antd';
import { optionLabel } from './optionLabels';
import { PARTS_FILTERS, type PartsView } from './partsView';
import styles from './PartsFilters.module.css';
import type { ChangeView } from './usePartsView';

interface PartsFiltersProps {
  view: PartsView;
  change: ChangeView;
}

/** The search box and the choices that narrow the list. */
export function PartsFilters({ view, change }: PartsFiltersProps) {
  return (
    <div role="search" aria-label="Parts" className={styles.filters}>
      <Input
        type="search"
        allowClear
        aria-label="Search parts"
        placeholder="Part number, maker or description"
        className={styles.search}
        value={view.search}
        onChange={(event) => change({ search: event.target.value })}
      />
      {PARTS_FILTERS.map(({ key, label, options }) => (
        <Select<string[]>
          key={key}
          mode="multiple"
          allowClear
          maxTagCount="responsive"
          showSearch={false}
          aria-label={label}
          placeholder={label}
          className={styles.choice}
          popupMatchSelectWidth={false}
          options={options.map((option) => ({ value: option, label: optionLabel(key, option) }))}
          value={view[key] ?? []}
          onChange={(chosen) => change({ [key]: chosen })}
        />
      ))}
    </div>
  );
}
