import { STAGE_SORTS, type StageSort } from '@roothertz/common/noise';
import listStyles from '../ConditionList.module.css';
import { SearchFieldInput } from './SearchFieldInput';
import styles from './SearchFields.module.css';
import type { StageSearchForm } from './useSearchAddress';

const LABELS: Record<StageSort, string> = { inputNoiseRms: 'noise', unitPrice: 'price' };

interface SortChoiceProps {
  form: StageSearchForm;
  sort: StageSort;
  onSort: (sort: StageSort) => void;
}

/** Sorts whole stages by noise, or by price within so many dB of the quietest. */
export function SortChoice({ form, sort, onSort }: SortChoiceProps) {
  return (
    <>
      <span>
        <span className={styles.label}>Sorted by</span>
        <select
          className={listStyles.choice}
          aria-label="sorted by"
          value={sort}
          onChange={({ target }) => onSort(target.value as StageSort)}
        >
          {STAGE_SORTS.map((one) => (
            <option key={one} value={one}>
              {LABELS[one]}
            </option>
          ))}
        </select>
      </span>
      {sort === 'unitPrice' && (
        <span>
          <SearchFieldInput form={form} name="within" label="within" />
          <span className={styles.label}> of the quietest</span>
        </span>
      )}
    </>
  );
}
