import { Input, Select } from 'antd';
import type { KindOfPart } from './kindOfPart';
import { optionLabel } from '../../components/optionLabels';
import { filtersOf, type PartsView } from './partsView';
import styles from './PartsFilters.module.css';
import type { ChangeFields } from '../../components/useAddressFields';
import { ValueWindow } from './ValueWindow';

interface PartsFiltersProps {
  kind: KindOfPart;
  view: PartsView;
  change: ChangeFields;
}

/** The search box and the choices that narrow the list. */
export function PartsFilters({ kind, view, change }: PartsFiltersProps) {
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
      {kind.narrowedBy && <ValueWindow field={kind.narrowedBy} view={view} change={change} />}
      {filtersOf(kind).map(({ key, label, options }) => (
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
