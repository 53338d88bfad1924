import {
  type Amplifier,
  type AmplifierOrigins,
  canBeUnknown,
  OP_AMP_PARAMETERS,
  type OpAmpPart,
  originsOfKnown,
  PART_FIELDS,
  type PartFieldKey,
} from '@roothertz/common/parts';

/** A part while it is written: what is required may still be missing. */
export type PartDraft = Record<PartFieldKey, string> & {
  amplifier: { [Key in keyof Amplifier]: Amplifier[Key] | null };
  origins: AmplifierOrigins;
};

/** A new part with every default; a figure that may be unknown is so until somebody states it. */
export function emptyDraft(): PartDraft {
  const texts = PART_FIELDS.map(({ key, fallback }) => [key, fallback ?? '']);
  const figures = OP_AMP_PARAMETERS.map((parameter) => [
    parameter.key,
    canBeUnknown(parameter) ? null : parameter.fallback,
  ]);
  return {
    ...Object.fromEntries(texts),
    amplifier: { inputType: null, ...Object.fromEntries(figures) },
    origins: {},
  } as PartDraft;
}

/** What can be changed of a part, without what the server keeps of it. */
export function draftOf(part: OpAmpPart): PartDraft {
  const texts = PART_FIELDS.map(({ key }) => [key, part[key]]);
  return {
    ...Object.fromEntries(texts),
    amplifier: { ...part.amplifier },
    origins: { ...part.origins },
  } as PartDraft;
}

/** The part that a complete draft stands for; the form has checked that nothing required is missing. */
export function partOf(draft: PartDraft): OpAmpPart {
  const part = draft as OpAmpPart;
  const stated = Object.entries(part.origins).filter(([, origin]) => origin !== undefined);
  return { ...part, origins: originsOfKnown(part.amplifier, Object.fromEntries(stated)) };
}
