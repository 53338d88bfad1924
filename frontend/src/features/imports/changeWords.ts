import type { FieldChange, PartValue } from '@roothertz/common/imports';
import {
  type ListedFields,
  ORIGIN_LABELS,
  type Origin,
  type ParameterDefinition,
  PART_FIELDS,
} from '@roothertz/common/parts';
import { formatQuantity } from '@roothertz/common/units';
import { optionLabel } from '../../components/optionLabels';

/** A changed value as a member reads it. */
export interface ChangeWords {
  label: string;
  /** Without its unit where that is the new one’s too. */
  old: string;
  next: string;
}

const FEWEST_DIGITS = 4;
const MOST_DIGITS = 15;

/** The words of a change; figures have as many digits as it takes to tell them apart. */
export function changeWords(catalogue: ListedFields, { field, old, new: next }: FieldChange): ChangeWords {
  const { label, show } = valueWords(catalogue, field);
  let digits = FEWEST_DIGITS;
  while (digits < MOST_DIGITS && show(old, digits) === show(next, digits)) digits += 1;
  return { label, ...withoutRepeatedUnit(show(old, digits), show(next, digits)) };
}

function valueWords(catalogue: ListedFields, path: string) {
  const key = path.split('.').at(-1)!;
  const parameter = catalogue.parameters.find((one) => one.key === key);
  if (parameter !== undefined && path.startsWith('origins.'))
    return {
      label: `${parameter.label}, origin`,
      show: (value: PartValue) => ORIGIN_LABELS[(value ?? 'typical') as Origin],
    };
  if (parameter !== undefined)
    return {
      label: parameter.label,
      show: (value: PartValue, digits: number) => figureWords(parameter, value, digits),
    };
  const label = [...PART_FIELDS, catalogue.choice].find((one) => one.key === key)?.label ?? key;
  return { label, show: (value: PartValue) => textWords(key, value) };
}

function figureWords({ kind }: ParameterDefinition, value: PartValue, digits: number): string {
  return value === null ? 'unknown' : formatQuantity(Number(value), kind, { digits, trim: true });
}

function textWords(key: string, value: PartValue): string {
  if (value === null) return 'unknown';
  return value === '' ? 'none' : optionLabel(key, String(value));
}

function withoutRepeatedUnit(old: string, next: string): { old: string; next: string } {
  const [, number, unit] = /^([-−\d.e]+)\s(\S+)$/.exec(old) ?? [];
  return { old: unit !== undefined && next.endsWith(`\u2009${unit}`) ? number : old, next };
}
