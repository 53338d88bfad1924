import {
  APPROVAL_LABELS,
  INPUT_TYPE_LABELS,
  LIFECYCLE_LABELS,
  ORIGIN_LABELS,
  ORIGINS,
  TECHNOLOGY_LABELS,
} from '@roothertz/common/parts';

const OPTION_LABELS: Readonly<Record<string, Readonly<Record<string, string>>>> = {
  lifecycle: LIFECYCLE_LABELS,
  approval: APPROVAL_LABELS,
  inputType: INPUT_TYPE_LABELS,
  technology: TECHNOLOGY_LABELS,
  library: { curated: 'curated', team: 'your own' },
  kind: { 'op-amp': 'op-amps', resistor: 'resistors' },
};

/** The words that a member reads for an option of a field. */
export function optionLabel(field: string, option: string): string {
  return OPTION_LABELS[field]?.[option] ?? option;
}

export function selectOptions(field: string, options: readonly string[]) {
  return options.map((value) => ({ value, label: optionLabel(field, value) }));
}

export const ORIGIN_OPTIONS = ORIGINS.map((value) => ({ value, label: ORIGIN_LABELS[value] }));
