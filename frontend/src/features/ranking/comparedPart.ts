import type { Amplifier } from '@roothertz/common/parts';

/** A part with what its curves are made of. */
export interface PlottedPart {
  id: string;
  partNumber: string;
  manufacturer: string;
  amplifier: Amplifier;
}

/** What the selected part is compared with: the leader, or where it leads itself the first beyond the quiet set. */
export function comparedWith<Part extends { id: string }>(
  selectedId: string,
  ranked: readonly { part: Part; quietSet: boolean }[],
): Part | null {
  const [leader] = ranked;
  if (leader && leader.part.id !== selectedId) return leader.part;
  const others = ranked.slice(1);
  const beyond = others.find(({ quietSet }) => !quietSet) ?? others[0];
  return beyond?.part ?? null;
}
