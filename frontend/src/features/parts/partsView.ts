import { APPROVALS, boundsError, gapFields, LIBRARIES, LIFECYCLES } from '@roothertz/common/parts';
import type { PartListFilter, PartListQuery } from '../../api/parts';
import type { KindOfPart } from './kindOfPart';

/** What the list shows, as the page's address holds it. */
export type PartsView = Omit<PartListQuery, 'limit' | 'offset'> & { search: string };

/** A choice that the list can be narrowed by, with its key in the address. */
export interface PartsFilter {
  key: 'library' | 'inputType' | 'technology' | 'lifecycle' | 'approval';
  label: string;
  options: readonly string[];
}

/** The ends of the window of values that the list can be narrowed by. */
const WINDOW_ENDS = ['resistanceFrom', 'resistanceTo'] as const;

const SORTED_WORDS = [
  'partNumber',
  'manufacturer',
  'package',
  'approval',
  'lifecycle',
  'library',
  'completeness',
];

export function filtersOf({ choice, catalogue }: KindOfPart): PartsFilter[] {
  return [
    { key: 'library', label: 'Library', options: LIBRARIES },
    { ...choice, options: catalogue.choice.options },
    { key: 'lifecycle', label: 'Lifecycle', options: LIFECYCLES },
    { key: 'approval', label: 'Approval', options: APPROVALS },
  ];
}

export function readPartsView(kind: KindOfPart, address: URLSearchParams): PartsView {
  return {
    search: address.get('search') ?? '',
    ...readSort(kind, address),
    ...readChoices(kind, address),
    ...readMissing(kind, address),
    ...readWindow(kind, address),
  };
}

function readSort({ catalogue }: KindOfPart, address: URLSearchParams): Pick<PartsView, 'sort'> {
  const sort = address.get('sort') ?? '';
  const figures = catalogue.parameters.map(({ key }) => key);
  const sorted = [...SORTED_WORDS, catalogue.choice.key, ...figures];
  return sorted.includes(sort.replace(/^-/, '')) ? { sort } : {};
}

function readChoices(kind: KindOfPart, address: URLSearchParams): Pick<PartsView, PartsFilter['key']> {
  const choices = filtersOf(kind).flatMap(({ key, options }) => {
    const words = (address.get(key) ?? '').split(',');
    const chosen = options.filter((option) => words.includes(option));
    return chosen.length === 0 ? [] : [[key, chosen] as const];
  });
  return Object.fromEntries(choices);
}

function readMissing({ catalogue }: KindOfPart, address: URLSearchParams): Pick<PartsView, 'missing'> {
  const words = (address.get('missing') ?? '').split(',');
  const missing = gapFields(catalogue).flatMap(({ key }) => (words.includes(key) ? [key] : []));
  return missing.length === 0 ? {} : { missing };
}

function readWindow({ narrowedBy }: KindOfPart, address: URLSearchParams): PartsView | object {
  if (narrowedBy === null) return {};
  const ends = WINDOW_ENDS.map((key) => [key, Number(address.get(key) ?? NaN)] as const);
  return Object.fromEntries(ends.filter(([, value]) => boundsError(narrowedBy, value) === null));
}

/** What narrows the list, as the server takes it. */
export function filterOf({ sort: _, search, ...narrowed }: PartsView): PartListFilter {
  return { ...narrowed, search: search.trim() || undefined };
}

export function isNarrowed(kind: KindOfPart, view: PartsView): boolean {
  return view.search.trim() !== '' || narrowingKeys(kind).some((key) => view[key] !== undefined);
}

/** Everything in the address that hides parts, beside the search. */
export function narrowingKeys(kind: KindOfPart): (keyof PartsView)[] {
  return [...filtersOf(kind).map(({ key }) => key), 'missing', ...WINDOW_ENDS];
}
