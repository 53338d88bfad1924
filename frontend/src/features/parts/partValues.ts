import {
  INPUT_TYPE_FIELD,
  OP_AMP_PARAMETERS,
  ORIGIN_LABELS,
  PART_FIELDS,
  type Origin,
} from '@roothertz/common/parts';
import { formatEditable } from '@roothertz/common/units';
import { optionLabel } from './optionLabels';
import type { PartDraft } from './partDraft';

/** One value of a part: where it stands and how a member reads it. */
export interface PartValue {
  path: string[];
  label: string;
  textOf: (part: PartDraft) => string;
}

/** Every value of an op-amp, from the catalogues. */
export const PART_VALUES: readonly PartValue[] = [
  ...PART_FIELDS.map(({ key, label }) => ({
    path: [key],
    label,
    textOf: (part: PartDraft) => optionLabel(key, part[key]) || 'none',
  })),
  {
    path: ['amplifier', 'inputType'],
    label: INPUT_TYPE_FIELD.label,
    textOf: ({ amplifier: { inputType } }) =>
      inputType === null ? 'unknown' : optionLabel('inputType', inputType),
  },
  ...OP_AMP_PARAMETERS.flatMap(({ key, label, kind }) => [
    {
      path: ['amplifier', key],
      label,
      textOf: ({ amplifier }: PartDraft) => {
        const value = amplifier[key];
        return value === null ? 'unknown' : formatEditable(value, kind);
      },
    },
    {
      path: ['origins', key],
      label: `${label}, origin`,
      textOf: ({ origins }: PartDraft) => ORIGIN_LABELS[originOf(origins[key])],
    },
  ]),
];

/** A parameter without a stated origin is a data sheet's typical value. */
export function originOf(stated: Origin | undefined): Origin {
  return stated ?? 'typical';
}

export function valueAt(part: PartDraft, path: readonly string[]): unknown {
  return path.reduce<unknown>((value, key) => (value as Record<string, unknown>)[key], part);
}

/** The draft with one value taken from another. */
export function withValueOf(draft: PartDraft, [key, inner]: readonly string[], from: PartDraft): PartDraft {
  const group = key as keyof PartDraft;
  if (inner === undefined) return { ...draft, [group]: from[group] };
  const value = valueAt(from, [key, inner]);
  return { ...draft, [group]: { ...(draft[group] as object), [inner]: value } };
}
