import type { PartsList } from './usePartsList';

/** The list in one line: how many parts, whose, and how many of them lack the figure that ranking needs most. */
export function partsFacts({ parts, total, isComplete }: PartsList, searched: boolean): string {
  if (searched) return `${count(parts.length, 'part')} found among ${count(total, 'part')}`;
  if (!isComplete)
    return `${count(total, 'part')}, of which the first ${parts.length} are shown: search for the others`;
  const curated = parts.filter(({ library }) => library === 'curated').length;
  const unknown = parts.filter(({ amplifier }) => amplifier.currentNoise === null).length;
  const whose = `${count(parts.length, 'part')}: ${curated} curated, ${parts.length - curated} of your own`;
  return unknown === 0 ? whose : `${whose}; ${unknown} without current noise`;
}

function count(number: number, noun: string): string {
  return `${new Intl.NumberFormat('en-GB').format(number).replaceAll(',', '\u2009')} ${noun}${number === 1 ? '' : 's'}`;
}
