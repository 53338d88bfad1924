import type { LibraryPart } from '@roothertz/common/parts';
import { OP_AMPS, type PartTable, RESISTORS } from '../library/part-tables.js';
import type { ImportKind } from './import-states.js';

/** Where the parts of each kind of import are kept. */
export function tableOf(kind: ImportKind): PartTable<LibraryPart> {
  return (kind === 'op-amps' ? OP_AMPS : RESISTORS) as unknown as PartTable<LibraryPart>;
}
