import type { QuantityField } from '@roothertz/common/parts';
import { QuantityInput } from '../../components/QuantityInput';
import styles from './PartsFilters.module.css';
import type { PartsView } from './partsView';
import type { ChangeFields } from '../../components/useAddressFields';

interface ValueWindowProps {
  field: QuantityField;
  view: PartsView;
  change: ChangeFields;
}

/** The least and the greatest value that the list shows; an empty end is open. */
export function ValueWindow({ field, view, change }: ValueWindowProps) {
  const { resistanceFrom, resistanceTo } = view;
  const isEmpty = (resistanceFrom ?? -Infinity) > (resistanceTo ?? Infinity);
  const commit = (end: 'resistanceFrom' | 'resistanceTo') => (value: number | null) =>
    change({ [end]: value === null ? undefined : String(value) });
  return (
    <div role="group" aria-label={field.label} className={styles.window}>
      <QuantityInput
        field={field}
        value={resistanceFrom ?? null}
        label={`${field.label} from`}
        emptyText={`least ${field.symbol}`}
        onCommit={commit('resistanceFrom')}
      />
      <span aria-hidden="true">to</span>
      <QuantityInput
        field={field}
        value={resistanceTo ?? null}
        label={`${field.label} to`}
        emptyText={`greatest ${field.symbol}`}
        error={isEmpty ? 'no value lies between these' : null}
        onCommit={commit('resistanceTo')}
      />
    </div>
  );
}
