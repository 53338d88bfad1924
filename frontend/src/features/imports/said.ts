import type { WholeList } from '@roothertz/common/imports';
import { type DialectChoice, type Import, type ImportDescription, mapImport } from '../../api/imports';
import { type Mapping, sameMapping, startingMapping } from './mappingDraft';

/** What a member says of a list: what its columns are, and what holds for all its rows. */
export interface Said {
  mapping: Mapping;
  wholeList: WholeList;
}

export function startingSaid(imported: Import): Said {
  return { mapping: startingMapping(imported), wholeList: imported.wholeList };
}

/** The server has what is said, and nothing else. */
export function isKept({ mapping, wholeList }: Said, imported: Import): boolean {
  return (
    sameMapping(mapping, imported.mapping) &&
    wholeList.supplier === imported.wholeList.supplier &&
    wholeList.currency === imported.wholeList.currency
  );
}

/**
 * Tells the server, which checks the rows by it.
 *
 * @param version the version of the import on which it is based
 */
export function tell(
  { id, kind }: Import,
  { mapping, wholeList: { supplier, currency } }: Said,
  version: number,
  choice: DialectChoice = {},
): Promise<Import> {
  const description: ImportDescription = { ...choice, columns: [...mapping], version };
  if (kind !== 'prices') return mapImport(id, description);
  const wholeList = { supplier: supplier ?? undefined, currency: currency ?? undefined };
  return mapImport(id, { ...description, wholeList });
}
