import { AUDIT_ACTIONS, AUDIT_OBJECTS, type AuditAction, type AuditObject } from '@roothertz/common/audit';
import { useQuery } from '@tanstack/react-query';
import { Input, Select } from 'antd';
import type { AuditFilter } from '../../api/audit';
import { teamMembersQuery } from '../../api/team';
import styles from './Trail.module.css';

interface TrailFiltersProps {
  filter: AuditFilter;
  narrow: (changes: AuditFilter) => void;
}

const ACTION_OPTIONS = optionsOf(AUDIT_ACTIONS);
const OBJECT_OPTIONS = optionsOf(AUDIT_OBJECTS);

/** What narrows the trail: who, what, to what, from when to when. */
export function TrailFilters({ filter, narrow }: TrailFiltersProps) {
  const { data: members = [] } = useQuery(teamMembersQuery);
  return (
    <div role="search" aria-label="Audit trail" className={styles.filters}>
      <Select<string>
        allowClear
        aria-label="Member"
        placeholder="Member"
        className={styles.choice}
        popupMatchSelectWidth={false}
        options={members.map(({ id, name }) => ({ value: id, label: name }))}
        value={filter.userId ?? null}
        onChange={(userId) => narrow({ userId })}
      />
      <Select<AuditAction[]>
        mode="multiple"
        allowClear
        maxTagCount="responsive"
        aria-label="Action"
        placeholder="Action"
        optionFilterProp="label"
        className={styles.choice}
        popupMatchSelectWidth={false}
        options={ACTION_OPTIONS}
        value={filter.action ?? []}
        onChange={(action) => narrow({ action })}
      />
      <Select<AuditObject>
        allowClear
        aria-label="Kind of object"
        placeholder="Object"
        className={styles.choice}
        popupMatchSelectWidth={false}
        options={OBJECT_OPTIONS}
        value={filter.objectKind ?? null}
        onChange={(objectKind) => narrow({ objectKind })}
      />
      <DayField label="from" value={filter.from} onChange={(from) => narrow({ from })} />
      <DayField label="to" value={filter.to} onChange={(to) => narrow({ to })} />
    </div>
  );
}

interface DayFieldProps {
  label: string;
  value: string | undefined;
  onChange: (day: string) => void;
}

function DayField({ label, value = '', onChange }: DayFieldProps) {
  return (
    <label className={styles.day}>
      {label}
      <Input type="date" value={value} onChange={(event) => onChange(event.target.value)} />
    </label>
  );
}

function optionsOf<Key extends string>(words: Record<Key, string>): { value: Key; label: string }[] {
  return Object.entries<string>(words).map(([value, label]) => ({ value: value as Key, label }));
}
