import { APPROVALS, INPUT_TYPES, LIBRARIES, LIFECYCLES, OP_AMP_PARAMETERS } from '@roothertz/common/parts';
import type { OpAmpListQuery } from '../../api/opAmps';

/** What the list can be narrowed by, each with its key in the address. */
export const PARTS_FILTERS = [
  { key: 'library', label: 'Library', options: LIBRARIES },
  { key: 'inputType', label: 'Input', options: INPUT_TYPES },
  { key: 'lifecycle', label: 'Lifecycle', options: LIFECYCLES },
  { key: 'approval', label: 'Approval', options: APPROVALS },
] as const;

export type PartsFilterKey = (typeof PARTS_FILTERS)[number]['key'];

/** What the list shows, as the page's address holds it. */
export type PartsView = Pick<OpAmpListQuery, PartsFilterKey | 'sort'> & { search: string };

const SORTS = new Set<string>([
  ...['partNumber', 'manufacturer', 'inputType', 'package', 'approval', 'lifecycle', 'library'],
  ...OP_AMP_PARAMETERS.map(({ key }) => key),
]);

export function readPartsView(address: URLSearchParams): PartsView {
  const sort = address.get('sort');
  const filters = PARTS_FILTERS.flatMap(({ key, options }) => {
    const chosen = options.filter((option) => (address.get(key) ?? '').split(',').includes(option));
    return chosen.length === 0 ? [] : [[key, chosen] as const];
  });
  return {
    search: address.get('search') ?? '',
    ...(sort !== null && SORTS.has(sort.replace(/^-/, '')) && { sort }),
    ...(Object.fromEntries(filters) as Pick<PartsView, PartsFilterKey>),
  };
}

export function isNarrowed(view: PartsView): boolean {
  return view.search.trim() !== '' || PARTS_FILTERS.some(({ key }) => view[key] !== undefined);
}
