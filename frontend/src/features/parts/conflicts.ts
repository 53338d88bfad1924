import type { ListedFields } from '@roothertz/common/parts';
import type { PartDraft } from './partDraft';
import { partValues, withValueOf, type PartValue } from './partValues';

/** A value that somebody else changed while it was edited here. */
export interface Conflict extends PartValue {
  before: string;
  mine: string;
  theirs: string;
  /** It was changed here too, so that a choice must be made. */
  isMineToo: boolean;
}

export type Choice = 'mine' | 'theirs';

/** What changed meanwhile, value by value, between what the edit began with and what is stored now. */
export function findConflicts(
  fields: ListedFields,
  base: PartDraft,
  mine: PartDraft,
  theirs: PartDraft,
): Conflict[] {
  const compared = partValues(fields).map((value) => ({
    ...value,
    before: value.textOf(base),
    mine: value.textOf(mine),
    theirs: value.textOf(theirs),
    isMineToo: value.textOf(mine) !== value.textOf(base),
  }));
  return compared.filter(({ before, mine: own, theirs: other }) => other !== before && other !== own);
}

/** My draft with theirs wherever that was chosen; what only they changed is theirs unless chosen otherwise. */
export function mergeDrafts(
  mine: PartDraft,
  theirs: PartDraft,
  conflicts: readonly Conflict[],
  choices: Readonly<Record<string, Choice>>,
): PartDraft {
  return conflicts
    .filter((conflict) => chosen(conflict, choices) === 'theirs')
    .reduce((draft, { path }) => withValueOf(draft, path, theirs), mine);
}

export function chosen(conflict: Conflict, choices: Readonly<Record<string, Choice>>): Choice {
  return choices[conflict.path.join('.')] ?? (conflict.isMineToo ? 'mine' : 'theirs');
}
