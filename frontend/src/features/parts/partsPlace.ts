import type { KindOfPart } from './kindOfPart';

/** What the pages show of a kind's parts. */
export type PartsPlace = 'list' | 'completeness' | 'duplicates';

export const PARTS_VIEWS: readonly { place: PartsPlace; label: string }[] = [
  { place: 'list', label: 'List' },
  { place: 'completeness', label: 'Completeness' },
  { place: 'duplicates', label: 'Duplicates' },
];

/** Only the team's own parts can be completed. */
export function placeAddress({ path }: Pick<KindOfPart, 'path'>, place: PartsPlace): string {
  if (place === 'completeness') return `${path}/completeness?library=team`;
  return place === 'list' ? path : `${path}/${place}`;
}
