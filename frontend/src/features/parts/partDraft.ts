import {
  canBeUnknown,
  type LibraryPart,
  type ListedFields,
  originsOfKnown,
  type Origins,
  type ParameterGroup,
  PART_FIELDS,
  type PartFieldKey,
} from '@roothertz/common/parts';
import type { Figures } from '../../api/parts';

/** A part while it is written: what is required may still be missing. */
export type PartDraft = Record<PartFieldKey, string> &
  Partial<Record<ParameterGroup, Figures>> & { origins: Origins };

/** A new part with every default; a figure that may be unknown is so until somebody states it. */
export function emptyDraft({ group, choice, parameters }: ListedFields): PartDraft {
  const texts = PART_FIELDS.map(({ key, fallback }) => [key, fallback ?? '']);
  const figures = parameters.map((parameter) => [
    parameter.key,
    canBeUnknown(parameter) ? null : parameter.fallback,
  ]);
  return {
    ...Object.fromEntries(texts),
    [group]: { [choice.key]: null, ...Object.fromEntries(figures) },
    origins: {},
  } as PartDraft;
}

/** What can be changed of a part, without what the server keeps of it. */
export function draftOf(fields: ListedFields, part: LibraryPart & PartDraft): PartDraft {
  const texts = PART_FIELDS.map(({ key }) => [key, part[key]]);
  return {
    ...Object.fromEntries(texts),
    [fields.group]: { ...figuresOf(fields, part) },
    origins: { ...part.origins },
  } as PartDraft;
}

/** The part that a complete draft stands for; the form has checked that nothing required is missing. */
export function partOf<Part extends LibraryPart>(fields: ListedFields, draft: PartDraft): Part {
  const stated = Object.entries(draft.origins).filter(([, origin]) => origin !== undefined);
  const origins = originsOfKnown(figuresOf(fields, draft), Object.fromEntries(stated));
  return { ...draft, origins } as LibraryPart as Part;
}

/** A part holds the figures of its own kind. */
export function figuresOf({ group }: ListedFields, part: Partial<Record<ParameterGroup, Figures>>): Figures {
  return part[group]!;
}

/** The figure of a parameter; null = unknown. */
export function figureOf(figures: Figures, key: string): number | null {
  return figures[key] as number | null;
}
