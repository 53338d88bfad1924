import { checkMapping } from '@roothertz/common/imports';
import { type DialectChoice, type Import, type ImportColumn, mapImport } from '../../api/imports';
import { KINDS } from './kinds';
import { type Mapping, proposedMapping } from './mappingDraft';

interface ReadAnew {
  answered: Import;
  /** A mapping with which the rows can’t be checked yet; null = the server has the one that stands. */
  unsent: Mapping | null;
}

/** Has the file read in another dialect, and its rows checked where the columns are still known. */
export async function readAnew(before: Import, mapping: Mapping, choice: DialectChoice): Promise<ReadAnew> {
  const read = await mapImport(before.id, choice);
  const columns = carriedMapping(before.columns, mapping, read.columns);
  if (checkMapping(KINDS[read.kind].catalogue, columns, read.columns.length).length > 0)
    return { answered: read, unsent: columns };
  return { answered: await mapImport(before.id, { columns: [...columns] }), unsent: null };
}

/** Columns whose heading stays keep what was said of them; the others take what is proposed. */
export function carriedMapping(
  before: readonly ImportColumn[],
  mapping: Mapping,
  after: readonly ImportColumn[],
): Mapping {
  const stays = new Set(
    after.filter(({ column, heading }) => before[column]?.heading === heading).map(({ column }) => column),
  );
  const kept = mapping.filter(({ column }) => stays.has(column));
  const proposed = proposedMapping(after).filter(
    ({ column, field, form }) =>
      !stays.has(column) &&
      (form === 'spot' || !kept.some((one) => one.field === field && one.form === form)),
  );
  return [...kept, ...proposed].sort((one, other) => one.column - other.column);
}
