import type { GapField } from '@roothertz/common/parts';
import { formatEditable } from '@roothertz/common/units';
import { Button, Select } from 'antd';
import type { StoredPart } from '../../../api/parts';
import { QuantityInput } from '../../../components/QuantityInput';
import { optionLabel, selectOptions } from '../../../components/optionLabels';
import type { KindOfPart } from '../kindOfPart';
import { figuresOf } from '../partDraft';
import styles from './Completeness.module.css';

interface GapItemProps {
  kind: KindOfPart;
  part: StoredPart;
  gap: GapField;
  /** Its field is open in every row. */
  isAsked: boolean;
  /** Its field was opened in this row. */
  isOpen: boolean;
  /** null = the part can't be changed here. */
  onOpen: (() => void) | null;
  onFill: (value: number | string | null) => void;
}

/** Something that a part lacked when it was listed: its name, a field to state it in, or what it is since. */
export function GapItem({ kind: { catalogue }, part, gap, isAsked, isOpen, onOpen, onFill }: GapItemProps) {
  const { key, label, meaning } = gap;
  const value = figuresOf(catalogue, part)[key];
  const parameter = catalogue.parameters.find((candidate) => candidate.key === key);
  const name = `${label} of ${part.partNumber}`;
  if (onOpen === null) return <span title={meaning}>{label}</span>;
  const field = { className: styles.field, ref: isAsked ? undefined : focusField };
  if ((isAsked || isOpen) && parameter)
    return (
      <span {...field}>
        {label}
        <QuantityInput
          field={parameter}
          label={name}
          value={value as number | null}
          emptyText="unknown"
          onCommit={(next) => next !== value && onFill(next)}
        />
      </span>
    );
  if (isAsked || isOpen)
    return (
      <span {...field}>
        {label}
        <Select
          aria-label={name}
          placeholder="unknown"
          allowClear
          className={styles.choice}
          options={selectOptions(key, catalogue.choice.options)}
          value={value as string | null}
          onChange={(next: string | undefined) => onFill(next ?? null)}
        />
      </span>
    );
  if (value === null)
    return (
      <Button size="small" title={meaning} onClick={onOpen} aria-label={`State ${name}`}>
        {label}
      </Button>
    );
  const words = parameter
    ? formatEditable(value as number, parameter.kind)
    : optionLabel(key, value as string);
  return (
    <Button size="small" type="text" onClick={onOpen} aria-label={`Change ${name}`}>
      {label} {words}
    </Button>
  );
}

/** The button that opened a field is gone: the field takes the focus. */
function focusField(field: HTMLElement | null): void {
  field?.querySelector('input')?.focus();
}
