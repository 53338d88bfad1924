import type { Gap } from './parameter.js';
import type { ListedFields } from './partCatalogue.js';

/** A parameter or choice that a part may lack, and what a ranking can't say without it. */
export interface GapField extends Gap {
  key: string;
  label: string;
}

/** What a kind of part may lack, what the ranking misses most first. */
export function gapFields({ choice, parameters }: ListedFields): GapField[] {
  const fields: readonly { key: string; label: string; gap?: Gap }[] = [choice, ...parameters];
  return fields
    .flatMap(({ key, label, gap }) => (gap === undefined ? [] : [{ key, label, ...gap }]))
    .sort((one, other) => other.weight - one.weight);
}

/**
 * What a part lacks, what the ranking misses most first.
 *
 * @param figures the part's parameters and choice by their keys; `null` = unknown
 */
export function gapsOf(fields: ListedFields, figures: Readonly<Record<string, unknown>>): GapField[] {
  return gapFields(fields).filter(({ key }) => figures[key] === null);
}

/**
 * How complete a part is for the ranking: the weights of what is known over the weights of all that can be, from 0 to 1.
 *
 * @param figures the part's parameters and choice by their keys; `null` = unknown
 */
export function completenessOf(fields: ListedFields, figures: Readonly<Record<string, unknown>>): number {
  return 1 - weightOf(gapsOf(fields, figures)) / weightOf(gapFields(fields));
}

function weightOf(gaps: readonly GapField[]): number {
  return gaps.reduce((sum, { weight }) => sum + weight, 0);
}
