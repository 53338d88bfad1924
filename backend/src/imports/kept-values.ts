import type { FieldChange } from '@roothertz/common/imports';
import { valuesOfPart } from '@roothertz/common/parts';
import { partOfCells } from '../library/bulk-parts.js';
import type { ImportKind } from './import-states.js';
import { tableOf } from './list-kinds.js';
import type { StoredRow } from './stored-row.js';

/** What would be kept of a part that a row adds. */
export function keptValues(kind: ImportKind, { content, partId }: StoredRow): FieldChange[] {
  if (content === undefined || partId !== undefined) return [];
  const table = tableOf(kind);
  const values = valuesOfPart(table.catalogue, partOfCells(table, content));
  return [...values]
    .filter(([, value]) => value !== null && value !== '')
    .map(([field, value]) => ({ field, old: null, new: value }));
}
