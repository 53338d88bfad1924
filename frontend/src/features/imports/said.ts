import type { WholeList } from '@roothertz/common/imports';
import { type Import, type ImportDescription, mapImport } from '../../api/imports';
import { type Mapping, sameMapping, startingMapping } from './mappingDraft';

/** What a member says of a list: what its columns are, and what holds for all its rows. */
export interface Said {
  mapping: Mapping;
  wholeList: WholeList;
  /** The version of the import on which it is based. */
  version: number;
}

export function startingSaid(imported: Import): Said {
  const { wholeList, version } = imported;
  return { mapping: startingMapping(imported), wholeList, version };
}

/** The server has what is said, and nothing else. */
export function isKept({ mapping, wholeList }: Said, imported: Import): boolean {
  return (
    sameMapping(mapping, imported.mapping) &&
    wholeList.supplier === imported.wholeList.supplier &&
    wholeList.currency === imported.wholeList.currency
  );
}

/** Tells the server, which checks the rows by it. */
export function tell({ id, kind }: Import, { mapping, wholeList, version }: Said): Promise<Import> {
  const stated: ImportDescription =
    kind === 'prices'
      ? {
          wholeList: { supplier: wholeList.supplier ?? undefined, currency: wholeList.currency ?? undefined },
        }
      : {};
  return mapImport(id, { columns: [...mapping], version, ...stated });
}

/** What stays to be said once the server has answered: nothing, or what was changed meanwhile. */
export function stillUnsaid(standing: Said | null, sent: Said, { version }: Import): Said | null {
  return standing === null || standing === sent ? null : { ...standing, version };
}
