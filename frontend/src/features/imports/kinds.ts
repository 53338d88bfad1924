import type { Action } from '@roothertz/common/access';
import { OP_AMP_CATALOGUE, RESISTOR_CATALOGUE } from '@roothertz/common/parts';
import type { ImportKind, PartListKind } from '../../api/imports';
import type { ListView } from './listView';
import { partView } from './partView';
import { PRICE_VIEW } from './priceView';

interface KindOfList {
  view: ListView;
  /** Such as `Op-amps`. */
  title: string;
  /** What a row is, such as `a part`. */
  row: string;
  /** Where what came in stands. */
  path: string;
  /** What a member must be allowed who brings such lists in. */
  action: Action;
  /** How all is after a cancelled import or an undone one. */
  asBefore: string;
  /** What an undoing leaves as it is. */
  stays: string;
}

const OF_PARTS = {
  row: 'a part',
  action: 'parts.edit',
  asBefore: 'the library is as it was before',
  stays: 'parts that were edited, priced or chosen since',
} as const;

/** What can be imported. */
export const KINDS: Readonly<Record<ImportKind, KindOfList>> = {
  'op-amps': { ...OF_PARTS, view: partView(OP_AMP_CATALOGUE), title: 'Op-amps', path: '/parts' },
  resistors: {
    ...OF_PARTS,
    view: partView(RESISTOR_CATALOGUE),
    title: 'Resistors',
    path: '/parts/resistors',
  },
  prices: {
    view: PRICE_VIEW,
    title: 'Prices',
    row: 'an offer',
    path: '/prices',
    action: 'prices.edit',
    asBefore: 'the prices are as they were before',
    stays: 'prices that were changed or confirmed since',
  },
};

export const PART_LISTS: readonly PartListKind[] = ['op-amps', 'resistors'];
