import { readAddressQuantity, writeAddressQuantity } from '../address/addressQuantity';
import { VIEW_KEY, VIEWS, type SearchField, type View } from './searchKeys';

export type SearchKeys = Record<string, SearchField>;

export interface SearchContent<Keys extends SearchKeys> {
  values: Record<keyof Keys, number>;
  /** What the address said that can't be read, by the field's path; the usual value stands in for it. */
  messages: ReadonlyMap<string, string>;
}

/** The view that an address asks for; op-amps where it names none or one that isn't there. */
export function readView(params: URLSearchParams): View {
  return VIEWS.find((view) => view === params.get(VIEW_KEY)) ?? 'op-amps';
}

export function withView(params: URLSearchParams, view: View): URLSearchParams {
  return withText(params, VIEW_KEY, view === 'op-amps' ? null : view);
}

/** The fields that an address holds beside the operating conditions. */
export function readSearch<Keys extends SearchKeys>(
  params: URLSearchParams,
  keys: Keys,
): SearchContent<Keys> {
  const messages = new Map<string, string>();
  const values = Object.entries(keys).map(([key, { field, path, usual }]) => {
    const text = params.get(key);
    const reading = text === null ? null : readAddressQuantity(text, field, false);
    if (reading?.ok) return [key, reading.value];
    if (reading) messages.set(path, reading.message);
    return [key, usual];
  });
  return { values: Object.fromEntries(values) as Record<keyof Keys, number>, messages };
}

/** The address with other values; those that are as usual aren't written. */
export function withSearch<Keys extends SearchKeys>(
  params: URLSearchParams,
  keys: Keys,
  values: Partial<Record<keyof Keys, number>>,
): URLSearchParams {
  return Object.entries(values).reduce((next, [key, value]) => {
    const { field, usual } = keys[key];
    return withText(next, key, value === usual ? null : writeAddressQuantity(value!, field.kind));
  }, params);
}

function withText(params: URLSearchParams, key: string, text: string | null): URLSearchParams {
  const next = new URLSearchParams(params);
  if (text === null) next.delete(key);
  else next.set(key, text);
  return next;
}
