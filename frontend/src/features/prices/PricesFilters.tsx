import { PART_KINDS } from '@roothertz/common/parts';
import { Input, Select } from 'antd';
import type { Supplier } from '../../api/prices';
import type { ChangeFields } from '../../components/useAddressFields';
import { selectOptions } from '../../components/optionLabels';
import styles from './PricesFilters.module.css';
import type { PricesView } from './pricesView';

interface PricesFiltersProps {
  view: PricesView;
  change: ChangeFields;
  suppliers: readonly Supplier[];
}

/** The search box and the choices that narrow the grid beside what calls for a look. */
export function PricesFilters({ view, change, suppliers }: PricesFiltersProps) {
  return (
    <div role="search" aria-label="Prices" className={styles.filters}>
      <Input
        type="search"
        allowClear
        aria-label="Search prices"
        placeholder="Part, maker, supplier or its number"
        className={styles.search}
        value={view.search}
        onChange={(event) => change({ search: event.target.value })}
      />
      <Select
        allowClear
        showSearch={{ optionFilterProp: 'label' }}
        aria-label="Supplier"
        placeholder="Supplier"
        className={styles.choice}
        popupMatchSelectWidth={false}
        options={suppliers.map(({ id, name }) => ({ value: id, label: name }))}
        value={view.supplierId}
        onChange={(supplierId: string | undefined) => change({ supplierId })}
      />
      <Select
        allowClear
        aria-label="Kind of part"
        placeholder="Kind of part"
        className={styles.choice}
        options={selectOptions('kind', PART_KINDS)}
        value={view.kind?.[0]}
        onChange={(kind: string | undefined) => change({ kind })}
      />
    </div>
  );
}
