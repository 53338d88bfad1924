import type { WholeList } from '@roothertz/common/imports';
import type { FieldError } from '@roothertz/common/parts';
import { useQuery } from '@tanstack/react-query';
import { AutoComplete, Select } from 'antd';
import { type ReactNode, useState } from 'react';
import { suppliersQuery } from '../../api/prices';
import { FieldMessage } from '../../components/FieldMessage';
import { CURRENCY_CHOICES } from './priceView';
import styles from './WholeListFields.module.css';

interface WholeListFieldsProps {
  wholeList: WholeList;
  errors: readonly FieldError[];
  /** What the list has a column for. */
  has: (field: string) => boolean;
  canChange: boolean;
  onChange: (next: WholeList) => void;
}

/** Whose price list it is, and in which currency, where it has no column that says so. */
export function WholeListFields({ wholeList, errors, has, canChange, onChange }: WholeListFieldsProps) {
  const faultOf = (field: keyof WholeList) =>
    errors.find((error) => error.field === `wholeList.${field}`)?.message;
  const { supplier, currency } = wholeList;
  if (has('supplier') && has('currency')) return null;
  return (
    <fieldset className={styles.fields}>
      <legend>For all rows</legend>
      {!has('supplier') && (
        <Stated label="supplier" fault={faultOf('supplier')} fixed={canChange ? null : (supplier ?? 'none')}>
          <SupplierName value={supplier} onCommit={(name) => onChange({ ...wholeList, supplier: name })} />
        </Stated>
      )}
      {!has('currency') && (
        <Stated label="currency" fault={faultOf('currency')} fixed={canChange ? null : (currency ?? 'none')}>
          <Select<string>
            aria-label="Currency of all rows"
            placeholder="such as EUR"
            showSearch
            allowClear
            options={CURRENCY_CHOICES}
            value={currency}
            onChange={(code) => onChange({ ...wholeList, currency: code ?? null })}
          />
        </Stated>
      )}
    </fieldset>
  );
}

interface StatedProps {
  label: string;
  fault: string | undefined;
  /** The value in words where it can’t be changed. */
  fixed: string | null;
  children: ReactNode;
}

function Stated({ label, fault, fixed, children }: StatedProps) {
  return (
    <div className={styles.field}>
      <span>{label}</span>
      {fixed ?? children}
      {fault !== undefined && <FieldMessage>{fault}</FieldMessage>}
    </div>
  );
}

/** One of the team’s suppliers, or the name of a new one; leaving the field or Enter commits. */
function SupplierName({
  value,
  onCommit,
}: {
  value: string | null;
  onCommit: (name: string | null) => void;
}) {
  const { data } = useQuery(suppliersQuery);
  const [text, setText] = useState(value ?? '');
  const commit = (name: string) => {
    setText(name);
    if ((name.trim() || null) !== value) onCommit(name.trim() || null);
  };
  return (
    <AutoComplete
      aria-label="Supplier of all rows"
      placeholder="a supplier’s name"
      options={data?.map(({ name }) => ({ value: name }))}
      showSearch={{
        filterOption: (input, option) => (option?.value ?? '').toLowerCase().includes(input.toLowerCase()),
      }}
      value={text}
      onChange={setText}
      onSelect={commit}
      onBlur={() => commit(text)}
      onInputKeyDown={(event) => event.key === 'Enter' && commit(text)}
    />
  );
}
