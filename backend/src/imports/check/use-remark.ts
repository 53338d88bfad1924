import type { Doubt } from '@roothertz/common/imports';
import type { PartUse } from '../../conditions/conditions-parts.js';

/** The saved conditions at which parts are chosen, by the part's id. */
export type PartUses = ReadonlyMap<number, readonly Pick<PartUse, 'name'>[]>;

/** What is said of a row that changes a part in use; it stays a changed one. */
export function useRemark(uses: PartUses, partId: number | undefined): Doubt[] {
  const at = uses.get(partId ?? 0) ?? [];
  if (at.length === 0) return [];
  const where = at.length === 1 ? `the saved conditions “${at[0].name}”` : `${at.length} saved conditions`;
  return [{ code: 'in-use', field: null, message: `used in ${where}` }];
}
