import { type ListedFields, ORIGIN_LABELS, type Origin, PART_FIELDS } from '@roothertz/common/parts';
import { formatEditable } from '@roothertz/common/units';
import { optionLabel } from '../../components/optionLabels';
import { figureOf, figuresOf, type PartDraft } from './partDraft';

/** One value of a part: where it stands and how a member reads it. */
export interface PartValue {
  path: string[];
  label: string;
  textOf: (part: PartDraft) => string;
}

/** Every value of a part, from the catalogues. */
export function partValues(fields: ListedFields): PartValue[] {
  const { group, choice, parameters } = fields;
  return [
    ...PART_FIELDS.map(({ key, label }) => ({
      path: [key],
      label,
      textOf: (part: PartDraft) => optionLabel(key, part[key]) || 'none',
    })),
    {
      path: [group, choice.key],
      label: choice.label,
      textOf: (part) => {
        const option = figuresOf(fields, part)[choice.key];
        return option === null ? 'unknown' : optionLabel(choice.key, String(option));
      },
    },
    ...parameters.flatMap(({ key, label, kind }) => [
      {
        path: [group, key],
        label,
        textOf: (part: PartDraft) => {
          const value = figureOf(figuresOf(fields, part), key);
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
}

/** A parameter without a stated origin is a data sheet's typical value. */
export function originOf(stated: Origin | undefined): Origin {
  return stated ?? 'typical';
}

/** The draft with one value taken from another. */
export function withValueOf(draft: PartDraft, [key, inner]: readonly string[], from: PartDraft): PartDraft {
  const group = key as keyof PartDraft;
  if (inner === undefined) return { ...draft, [group]: from[group] };
  const value = (from[group] as Record<string, unknown>)[inner];
  return { ...draft, [group]: { ...(draft[group] as object), [inner]: value } };
}
