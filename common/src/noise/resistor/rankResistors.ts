import { smallestPositions } from '../../numeric/index.js';
import {
  APPROVAL_LABELS,
  isRetiredUnasked,
  LIFECYCLE_LABELS,
  RETIRED_DETAIL,
  TECHNOLOGY_LABELS,
  type Approval,
  type Lifecycle,
  type Resistor,
} from '../../parts/index.js';
import { formatQuantity } from '../../units/index.js';
import type { ResistorConditions, ResistorFilter } from '../../conditions/index.js';
import { ohmNoise, resistorNoise, type ResistorFigures } from './resistorNoise.js';

/** A resistor as the ranking takes it. */
export interface LibraryResistor extends Resistor {
  lifecycle: Lifecycle;
  approval: Approval;
  package: string;
  /** manufacturer, part number and description in lower case */
  searchText: string;
}

export const RESISTOR_EXCLUSION_REASONS = [
  'lifecycle',
  'approval',
  'retired',
  'technology',
  'tolerance',
  'package',
  'over-rating',
] as const;
export type ResistorExclusionReason = (typeof RESISTOR_EXCLUSION_REASONS)[number];

export const RESISTOR_EXCLUSION_LABELS: Record<ResistorExclusionReason, string> = {
  lifecycle: 'lifecycle not chosen',
  approval: 'approval not chosen',
  retired: 'retired',
  technology: 'technology not chosen',
  tolerance: 'tolerance too wide',
  package: 'other package',
  'over-rating': 'dissipates more than its rating',
};

/** The figures by which a ranking of resistors can be sorted; `-` in front = descending. */
export const RESISTOR_SORTS = [
  'totalRms',
  'aboveThermal',
  'dissipation',
  'resistance',
  'tolerance',
  'unitPrice',
] as const;
export type ResistorSort = (typeof RESISTOR_SORTS)[number];

export interface ResistorQuery {
  conditions: ResistorConditions;
  filter: ResistorFilter;
  sort: ResistorSort;
  descending: boolean;
  limit: number;
  offset: number;
  /** what each resistor costs, in one currency; NaN = without a price */
  prices?: Float64Array;
}

/** A resistor of the ranking, by its place in the list that was given. */
export interface RankedResistor {
  index: number;
  rank: number;
  figures: ResistorFigures;
}

export interface ExcludedResistor {
  index: number;
  reason: ResistorExclusionReason;
  /** the reason in plain words, with its figures */
  detail: string;
}

export interface ResistorRanking {
  total: number;
  excluded: ExcludedResistor[];
  items: RankedResistor[];
}

/**
 * Ranks the resistors within the tolerance window of the wanted value by their noise at the place. Parts
 * outside the window, or that don't hold every word of the search, aren't considered at all; parts that
 * would dissipate more than their rating are excluded. Where a direct voltage makes excess noise, parts of
 * unknown noise index come last: their total is only known to be no less than the thermal noise.
 *
 * @returns the page wanted, equal figures in the order of the list
 */
export function rankResistors(query: ResistorQuery, resistors: readonly LibraryResistor[]): ResistorRanking {
  const { conditions, filter } = query;
  const sought = seek(conditions, filter, resistors);
  const excluded: ExcludedResistor[] = [];
  const accepted = sought.filter((index) => {
    const reason = exclusion(conditions, filter, resistors[index]);
    if (reason) excluded.push({ index, reason, detail: detailOf(reason, conditions, resistors[index]) });
    return reason === null;
  });
  const figures = figuresOf(conditions, resistors, accepted);
  const keys = Float64Array.from(accepted, (index, n) => sortKey(query, resistors, index, figures[n]));
  const page = smallestPositions(keys, query.offset + query.limit).subarray(query.offset);
  return {
    total: accepted.length,
    excluded,
    items: Array.from(page, (n, place) => ({
      index: accepted[n],
      rank: query.offset + place + 1,
      figures: figures[n],
    })),
  };
}

function seek(
  { resistance, resistanceTolerance }: ResistorConditions,
  { search = '' }: ResistorFilter,
  resistors: readonly LibraryResistor[],
): number[] {
  const words = search.toLowerCase().split(/\s+/).filter(Boolean);
  /** Values are decimal: 1.02 kΩ lies within 2 % of 1 kΩ whatever the rounding of its double. */
  const window = resistance * (resistanceTolerance + 1e-12);
  return resistors.flatMap((resistor, index) => {
    const near = Math.abs(resistor.resistance - resistance) <= window;
    return near && words.every((word) => resistor.searchText.includes(word)) ? [index] : [];
  });
}

function exclusion(
  { dcVoltage }: ResistorConditions,
  filter: ResistorFilter,
  resistor: LibraryResistor,
): ResistorExclusionReason | null {
  const { powerRating, resistance } = resistor;
  const filtered = resistorFilterExclusion(filter, resistor);
  if (filtered) return filtered;
  return powerRating !== null && dcVoltage ** 2 / resistance > powerRating ? 'over-rating' : null;
}

/** Why the filter alone leaves a resistor out, or null where it may be used. */
export function resistorFilterExclusion(
  filter: ResistorFilter,
  { lifecycle, approval, technology, tolerance, package: name }: LibraryResistor,
): ResistorExclusionReason | null {
  if (filter.lifecycle?.length && !filter.lifecycle.includes(lifecycle)) return 'lifecycle';
  if (filter.approval?.length && !filter.approval.includes(approval)) return 'approval';
  if (isRetiredUnasked({ lifecycle, approval }, filter)) return 'retired';
  if (filter.technology?.length && (!technology || !filter.technology.includes(technology)))
    return 'technology';
  if (filter.tolerance !== undefined && (tolerance === null || tolerance > filter.tolerance))
    return 'tolerance';
  const packageName = filter.package?.trim().toLowerCase() ?? '';
  return name.toLowerCase().includes(packageName) ? null : 'package';
}

function detailOf(
  reason: ResistorExclusionReason,
  { dcVoltage }: ResistorConditions,
  resistor: LibraryResistor,
): string {
  const watts = (value: number) => formatQuantity(value, 'power', { trim: true });
  const details: Record<ResistorExclusionReason, () => string> = {
    lifecycle: () => `its lifecycle is “${LIFECYCLE_LABELS[resistor.lifecycle]}”`,
    approval: () => `its approval is “${APPROVAL_LABELS[resistor.approval]}”`,
    retired: () => RETIRED_DETAIL,
    technology: () =>
      resistor.technology ? `it is ${TECHNOLOGY_LABELS[resistor.technology]}` : 'its technology is unknown',
    tolerance: () =>
      resistor.tolerance === null
        ? 'its tolerance is unknown'
        : `its tolerance is ${formatQuantity(resistor.tolerance, 'fraction', { trim: true })}`,
    package: () => `its package is ${resistor.package || 'unknown'}`,
    'over-rating': () =>
      `would dissipate ${watts(dcVoltage ** 2 / resistor.resistance)}, rated for ${watts(resistor.powerRating!)}`,
  };
  return details[reason]();
}

function figuresOf(
  conditions: ResistorConditions,
  resistors: readonly LibraryResistor[],
  accepted: readonly number[],
): ResistorFigures[] {
  const noiseOfOhm = ohmNoise(conditions.band);
  const atAmbient = noiseOfOhm(conditions.ambientTemperature);
  const remembered = (temperature: number) =>
    temperature === conditions.ambientTemperature ? atAmbient : noiseOfOhm(temperature);
  return accepted.map((index) => resistorNoise(conditions, resistors[index], remembered));
}

function sortKey(
  { sort, descending, prices }: ResistorQuery,
  resistors: readonly LibraryResistor[],
  index: number,
  figures: ResistorFigures,
): number {
  const { resistance, tolerance } = resistors[index];
  const unitPrice = prices?.[index] ?? NaN;
  const isBound = figures.excessRms === null && (sort === 'totalRms' || sort === 'aboveThermal');
  const value = isBound ? NaN : { ...figures, resistance, tolerance: tolerance ?? NaN, unitPrice }[sort];
  return descending ? -value : value;
}
