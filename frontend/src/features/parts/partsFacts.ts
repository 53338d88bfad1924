import { countOf, grouped } from '../../components/countOf';
import type { KindOfPart } from './kindOfPart';
import { figuresOf } from './partDraft';
import type { PartsList } from './usePartsList';

/** The list in one line: how many parts, whose, and how many of them lack the figure that ranking needs most. */
export function partsFacts(
  { catalogue, mostMissed: { key, label } }: KindOfPart,
  { parts, total, matching, isComplete }: Pick<PartsList, 'parts' | 'total' | 'matching' | 'isComplete'>,
  searched: boolean,
): string {
  if (searched) return foundFacts(parts.length, matching, total);
  if (!isComplete)
    return `${countOf(total, 'part')}, of which the first ${grouped(parts.length)} are shown: search or narrow for the others`;
  const curated = parts.filter(({ library }) => library === 'curated').length;
  const unknown = parts.filter((part) => figuresOf(catalogue, part)[key] === null).length;
  const whose = `${countOf(parts.length, 'part')}: ${curated} curated, ${parts.length - curated} of your own`;
  return unknown === 0 ? whose : `${whose}; ${unknown} without ${label}`;
}

function foundFacts(shown: number, matching: number, total: number): string {
  const found = `${countOf(Math.max(shown, matching), 'part')} found among ${countOf(total, 'part')}`;
  return matching > shown ? `${found}, of which the first ${grouped(shown)} are shown` : found;
}
