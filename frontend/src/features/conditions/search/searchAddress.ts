import { RESISTOR_CONDITION_FIELDS } from '@roothertz/common/conditions';
import { STAGE_SORTS, type StageSort } from '@roothertz/common/noise';
import { TECHNOLOGIES, type Technology } from '@roothertz/common/parts';
import { readAddressQuantity, writeAddressQuantity } from '../address/addressQuantity';
import {
  SORT_KEY,
  TECHNOLOGY_KEY,
  TOLERANCE_KEY,
  VIEW_KEY,
  VIEWS,
  type SearchField,
  type View,
} from './searchKeys';

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

/** What an address sorts whole stages by; by noise where it says nothing that is known. */
export function readSort(params: URLSearchParams): StageSort {
  return STAGE_SORTS.find((sort) => sort === params.get(SORT_KEY)) ?? 'inputNoiseRms';
}

export function withSort(params: URLSearchParams, sort: StageSort): URLSearchParams {
  return withText(params, SORT_KEY, sort === 'inputNoiseRms' ? null : sort);
}

/** The technologies of resistors that an address names, in the usual order; what isn't known is passed over. */
export function readTechnologies(params: URLSearchParams): Technology[] {
  const named = (params.get(TECHNOLOGY_KEY) ?? '').split(/[ ,]/);
  return TECHNOLOGIES.filter((technology) => named.includes(technology));
}

export function withTechnologies(params: URLSearchParams, chosen: readonly Technology[]): URLSearchParams {
  return withText(params, TECHNOLOGY_KEY, chosen.length === 0 ? null : chosen.join(' '));
}

const TOLERANCE = RESISTOR_CONDITION_FIELDS['filter.tolerance'];

/** The widest tolerance of resistors that an address names; null = any. */
export function readTolerance(params: URLSearchParams): number | null {
  const text = params.get(TOLERANCE_KEY);
  const reading = text === null ? null : readAddressQuantity(text, TOLERANCE, false);
  return reading?.ok ? (reading.value as number) : null;
}

export function withTolerance(params: URLSearchParams, most: number | null): URLSearchParams {
  return withText(params, TOLERANCE_KEY, most === null ? null : writeAddressQuantity(most, TOLERANCE.kind));
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
