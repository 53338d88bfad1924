import { type DialectChoice, type Import, type ImportColumn, mapImport } from '../../api/imports';
import { KINDS } from './kinds';
import { type Mapping, proposedMapping } from './mappingDraft';
import { type Said, tell } from './said';

interface ReadAnew {
  answered: Import;
  /** What can’t be checked yet; null = the server has what stands. */
  unsent: Said | null;
}

/**
 * Has the file read in another dialect, and its rows checked where the columns are still known: at once where the
 * columns stay what they are.
 */
export async function readAnew(
  before: Import,
  said: Said,
  choice: DialectChoice,
  version: number,
): Promise<ReadAnew> {
  const isKnown = (mapping: Mapping, columns: readonly ImportColumn[]) =>
    KINDS[before.kind].view.columns.check(mapping, columns.length, said.wholeList).length === 0;
  const keepsColumns = Object.keys(choice).every((name) => name === 'decimalMark');
  if (keepsColumns && isKnown(said.mapping, before.columns))
    return { answered: await tell(before, said, version, choice), unsent: null };
  const read = await mapImport(before.id, { ...choice, version });
  const mapping = carriedMapping(before.columns, said.mapping, read.columns);
  const carried = { mapping, wholeList: said.wholeList };
  if (!isKnown(mapping, read.columns)) return { answered: read, unsent: carried };
  return { answered: await tell(read, carried, read.version), unsent: null };
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
      (form === 'spot' || form === 'break' || !kept.some((one) => one.field === field && one.form === form)),
  );
  return [...kept, ...proposed].sort((one, other) => one.column - other.column);
}
