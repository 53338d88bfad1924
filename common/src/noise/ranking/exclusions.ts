import type { OperatingConditions, PartFilter } from '../../conditions/index.js';
import { isRetiredUnasked } from '../../parts/index.js';
import { EXCLUSION_REASONS, type ExclusionReason } from '../cautions.js';
import type { StageModel } from '../stage/model.js';
import type { AmplifierColumns } from './columns.js';
import { preparedColumns } from './preparedColumns.js';

/** The words of a search text, each of which a part must contain. */
export function searchWords(search: string | undefined): string[] {
  return (search ?? '').toLowerCase().split(/\s+/).filter(Boolean);
}

/** Whether a part contains every word of the search; parts that don't aren't considered at all. */
export function isSought(columns: AmplifierColumns, row: number, words: readonly string[]): boolean {
  return words.every((word) => columns.searchText[row].includes(word));
}

/** What is said of a row that isn't excluded. */
export const RANKED = -1;

/** Says of a row why it is excluded, as the reason's place in EXCLUSION_REASONS; the first that applies counts. */
export type Exclude = (row: number) => number;

const PLACE = Object.fromEntries(EXCLUSION_REASONS.map((reason, place) => [reason, place])) as Record<
  ExclusionReason,
  number
>;

/** The exclusions of the conditions and the filter, prepared once for a library. */
export function prepareExclusions(
  conditions: OperatingConditions,
  filter: PartFilter,
  model: StageModel,
  columns: AmplifierColumns,
): Exclude {
  const byFilter = filterExclusions(filter, columns);
  const byConditions = conditionExclusions(conditions, model, columns);
  return (row) => {
    const filtered = byFilter(row);
    return filtered === RANKED ? byConditions(row) : filtered;
  };
}

/** The exclusions that only the filter makes, whatever the conditions. */
export function filterExclusions(filter: PartFilter, columns: AmplifierColumns): Exclude {
  const { of: classOf, examples } = preparedColumns(columns).classes;
  const ofClass = Int8Array.from(examples, wordExclusions(filter, columns));
  const byWords: Exclude = (row) => ofClass[classOf[row]];
  if (filter.channels === undefined && filter.supply === undefined) return byWords;
  const byFigures = figureExclusions(filter, columns);
  return (row) => (byWords(row) === RANKED ? byFigures(row) : byWords(row));
}

function figureExclusions(filter: PartFilter, { parameters }: AmplifierColumns): Exclude {
  const { channels: least = 0, supply = { minimum: Infinity, maximum: -Infinity } } = filter;
  const { channels, supplyMinimum, supplyMaximum } = parameters;
  return (row) => {
    if (channels[row] < least) return PLACE['too-few-channels'];
    const isShort = supplyMinimum[row] > supply.minimum || supplyMaximum[row] < supply.maximum;
    return isShort ? PLACE['supply-out-of-range'] : RANKED;
  };
}

function wordExclusions(filter: PartFilter, columns: AmplifierColumns): Exclude {
  const lifecycles = chosen<string>(filter.lifecycle);
  const approvals = chosen<string>(filter.approval);
  const inputTypes = chosen<string | null>(filter.inputType);
  const packageName = filter.package?.trim().toLowerCase();
  return (row) => {
    const [lifecycle, approval] = [columns.lifecycle[row], columns.approval[row]];
    if (lifecycles && !lifecycles.has(lifecycle)) return PLACE.lifecycle;
    if (approvals && !approvals.has(approval)) return PLACE.approval;
    if (isRetiredUnasked({ lifecycle, approval }, filter)) return PLACE.retired;
    if (inputTypes && !inputTypes.has(columns.inputType[row])) return PLACE['input-type'];
    if (packageName && !columns.package[row].toLowerCase().includes(packageName)) return PLACE.package;
    return RANKED;
  };
}

/** The words of a list that narrows; an empty list narrows nothing, as one that is left out. */
function chosen<Word>(words: readonly Word[] | undefined): ReadonlySet<Word> | null {
  return words?.length ? new Set(words) : null;
}

/** The exclusions that only the conditions make, whatever the filter. */
export function conditionExclusions(
  conditions: OperatingConditions,
  model: StageModel,
  columns: AmplifierColumns,
): Exclude {
  const { band, bandwidthMargin } = conditions;
  const needed = bandwidthMargin * band.upper;
  const { gainBandwidth, inputCapacitance } = preparedColumns(columns);
  const { minimumStableGain } = columns.parameters;
  return (row) => {
    const speed = gainBandwidth[row];
    const capacitance = inputCapacitance[row];
    if (model.crossoverNoiseGain(speed, capacitance) < minimumStableGain[row])
      return PLACE['below-minimum-stable-gain'];
    if (speed < Infinity && speed / model.noiseGain(band.upper, speed, capacitance) < needed)
      return PLACE['too-slow'];
    return hasNoEnd(conditions, model, speed, capacitance) ? PLACE['noise-unbounded'] : RANKED;
  };
}

/**
 * Whether the noise at the output has no finite rms: with an ideal amplifier whose noise gain rises with
 * frequency, a low-pass of first order doesn't end it.
 */
export function hasNoEnd(
  { band }: OperatingConditions,
  model: StageModel,
  gainBandwidth: number,
  inputCapacitance: number,
): boolean {
  return gainBandwidth === Infinity && band.lowPassOrder === 1 && model.growth(inputCapacitance) === 2;
}
