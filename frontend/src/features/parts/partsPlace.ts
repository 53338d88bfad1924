import type { KindOfPart } from './kindOfPart';

/** What the pages show of a kind's parts. */
export type PartsPlace = 'list' | 'completeness';

export const PARTS_VIEWS: readonly { place: PartsPlace; label: string }[] = [
  { place: 'list', label: 'List' },
  { place: 'completeness', label: 'Completeness' },
];

/** Only the team's own parts can be completed. */
export function placeAddress({ path }: Pick<KindOfPart, 'path'>, place: PartsPlace): string {
  return place === 'list' ? path : `${path}/completeness?library=team`;
}
