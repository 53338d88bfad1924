import { type ListedFields, OP_AMP_CATALOGUE, RESISTOR_CATALOGUE } from '@roothertz/common/parts';
import type { ImportKind } from '../../api/imports';

interface KindOfList {
  catalogue: ListedFields;
  /** Such as `Op-amps`. */
  title: string;
  /** Where the parts stand. */
  path: string;
}

/** What can be imported. */
export const KINDS: Readonly<Record<ImportKind, KindOfList>> = {
  'op-amps': { catalogue: OP_AMP_CATALOGUE, title: 'Op-amps', path: '/parts' },
  resistors: { catalogue: RESISTOR_CATALOGUE, title: 'Resistors', path: '/parts/resistors' },
};
