import {
  APPROVAL_LABELS,
  APPROVALS,
  INPUT_TYPE_LABELS,
  INPUT_TYPES,
  LIBRARIES,
  LIFECYCLE_LABELS,
  LIFECYCLES,
  type Library,
} from '@roothertz/common/parts';
import { useState } from 'react';
import styles from './ConditionList.module.css';
import { useConditionsForm } from './ConditionsContext';
import { describeFilter } from './describeFilter';
import { FilterChoice } from './FilterChoice';
import { FilterText } from './FilterText';

const LIBRARY_LABELS: Record<Library, string> = { curated: 'curated library', team: 'own list' };

/** Which parts count: one line that says it, and the choices that fold out below. */
export function PartsFilter() {
  const { request, messages } = useConditionsForm();
  const refused = [...messages.keys()].some((field) => CHOICE_FIELDS.includes(field));
  const [opened, setOpened] = useState(false);
  const open = opened || refused;
  return (
    <>
      <div className={styles.row}>
        <span className={styles.label}>Search</span>
        <FilterText path="filter.search" label="parts that contain" emptyText="all parts" id="part-search" />
      </div>
      <div className={styles.row}>
        <span className={styles.label}>Parts</span>
        <button
          type="button"
          className={styles.unfold}
          aria-expanded={open}
          aria-controls="parts-filter"
          onClick={() => setOpened(!open)}
        >
          {describeFilter(request.filter)} {open ? '▴' : '▾'}
        </button>
      </div>
      {open && (
        <div id="parts-filter" className={styles.choices}>
          <FilterChoice path="filter.library" label="Library" words={LIBRARIES} names={LIBRARY_LABELS} />
          <FilterChoice
            path="filter.lifecycle"
            label="Lifecycle"
            words={LIFECYCLES}
            names={LIFECYCLE_LABELS}
          />
          <FilterChoice path="filter.approval" label="Approval" words={APPROVALS} names={APPROVAL_LABELS} />
          <FilterChoice path="filter.inputType" label="Input" words={INPUT_TYPES} names={INPUT_TYPE_LABELS} />
          <div className={styles.row}>
            <span className={styles.label}>Package contains</span>
            <FilterText path="filter.package" label="package contains" emptyText="any" />
          </div>
        </div>
      )}
    </>
  );
}

const CHOICE_FIELDS = ['filter.library', 'filter.lifecycle', 'filter.approval', 'filter.inputType'];
