import { RETIRED, type Standing } from '@roothertz/common/parts';
import type { StandingChange, StandingOutcome, StoredPart } from '../../../api/parts';
import { optionLabel } from '../../../components/optionLabels';
import { countOf, grouped } from '../../../components/countOf';

export type Wanted = Partial<Standing>;

/** What becomes of chosen parts that are to stand otherwise. */
export interface StandingPlan {
  wanted: Wanted;
  chosen: number;
  changed: readonly StoredPart[];
  /** They stand so already. */
  unchanged: number;
  curated: number;
}

export function planStanding(parts: readonly StoredPart[], wanted: Wanted): StandingPlan {
  const own = parts.filter(({ library }) => library === 'team');
  const changed = own.filter((part) => !standsSo(part, wanted));
  return {
    wanted,
    chosen: parts.length,
    changed,
    unchanged: own.length - changed.length,
    curated: parts.length - own.length,
  };
}

export function changesOf({ changed, wanted }: StandingPlan): StandingChange[] {
  return changed.map(({ id, version }) => ({ id, version, ...wanted }));
}

/** What brings the parts back to how they stood, from the versions that they have since. */
export function changesBack(
  { changed }: StandingPlan,
  since: readonly Pick<StoredPart, 'id' | 'version'>[],
): StandingChange[] {
  const versions = new Map(since.map(({ id, version }) => [id, version]));
  return changed.map(({ id, lifecycle, approval }) => ({
    id,
    version: versions.get(id)!,
    lifecycle,
    approval,
  }));
}

/** "Sets 37 of 40 parts to obsolete; 3 curated ones can’t be changed." */
export function planWords({ wanted, changed, ...counts }: StandingPlan): string {
  return outcomeWords(wanted, { ...counts, changed: changed.length });
}

/** The same of parts of which only the numbers are known. */
export function outcomeWords(
  wanted: Wanted,
  { chosen, changed, unchanged, curated }: Omit<StandingOutcome, 'libraryRevision'>,
): string {
  const acts = isRetirement(wanted) ? 'Retires' : 'Sets';
  const target = isRetirement(wanted) ? ': obsolete and not approved' : ` to ${wantedWords(wanted)}`;
  const share = changed === chosen ? '' : `${grouped(changed)} of `;
  const rest = [
    ...(unchanged > 0 ? [`${grouped(unchanged)} ${unchanged === 1 ? 'is' : 'are'} so already`] : []),
    ...(curated > 0 ? [`${countOf(curated, 'curated one')} can’t be changed`] : []),
  ];
  return `${acts} ${share}${countOf(chosen, 'part')}${target}${rest.length > 0 ? `; ${rest.join(', ')}` : ''}.`;
}

/** "37 parts are set to obsolete" */
export function doneWords({ wanted, changed }: StandingPlan): string {
  const which = changed.length === 1 ? changed[0].partNumber : countOf(changed.length, 'part');
  return setWords(wanted, which, changed.length);
}

export function setWords(wanted: Wanted, which: string, count: number): string {
  const are = count === 1 ? 'is' : 'are';
  return `${which} ${are} ${isRetirement(wanted) ? 'retired' : `set to ${wantedWords(wanted)}`}`;
}

export function isStated({ lifecycle, approval }: Wanted): boolean {
  return lifecycle !== undefined || approval !== undefined;
}

export function isRetirement(wanted: Wanted): boolean {
  return standsSo(RETIRED, wanted) && wanted.lifecycle !== undefined && wanted.approval !== undefined;
}

function standsSo(standing: Standing, { lifecycle, approval }: Wanted): boolean {
  return (
    (lifecycle === undefined || lifecycle === standing.lifecycle) &&
    (approval === undefined || approval === standing.approval)
  );
}

function wantedWords({ lifecycle, approval }: Wanted): string {
  const words = [
    ...(lifecycle === undefined ? [] : [optionLabel('lifecycle', lifecycle)]),
    ...(approval === undefined ? [] : [optionLabel('approval', approval)]),
  ];
  return words.join(' and ');
}
