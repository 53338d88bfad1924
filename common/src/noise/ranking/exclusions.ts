import type { OperatingConditions, PartFilter } from '../../conditions/index.js';
import { isRetiredUnasked } from '../../parts/index.js';
import type { ExclusionReason } from '../cautions.js';
import type { StageModel } from '../stage/model.js';
import type { AmplifierColumns } from './columns.js';

/** The words of a search text, each of which a part must contain. */
export function searchWords(search: string | undefined): string[] {
  return (search ?? '').toLowerCase().split(/\s+/).filter(Boolean);
}

/** Whether a part contains every word of the search; parts that don't aren't considered at all. */
export function isSought(columns: AmplifierColumns, row: number, words: readonly string[]): boolean {
  return words.every((word) => columns.searchText[row].includes(word));
}

/** Says of a row why it is excluded, or null where it is ranked; the first reason that applies counts. */
export type Exclude = (columns: AmplifierColumns, row: number) => ExclusionReason | null;

/** The exclusions of the conditions and the filter, prepared once. */
export function prepareExclusions(
  conditions: OperatingConditions,
  filter: PartFilter,
  model: StageModel,
): Exclude {
  const byFilter = filterExclusions(filter);
  const { band, bandwidthMargin } = conditions;
  const needed = bandwidthMargin * band.upper;
  return (columns, row) => {
    const filtered = byFilter(columns, row);
    if (filtered) return filtered;
    const { gainBandwidth, inputCapacitance, minimumStableGain } = columns.parameters;
    const capacitance = inputCapacitance[row] || 0;
    const bandwidth = gainBandwidth[row];
    const known = !Number.isNaN(bandwidth);
    const speed = known ? bandwidth : Infinity;
    if (model.crossoverNoiseGain(speed, capacitance) < minimumStableGain[row])
      return 'below-minimum-stable-gain';
    if (known && bandwidth / model.noiseGain(band.upper, bandwidth, capacitance) < needed) return 'too-slow';
    if (hasNoEnd(conditions, model, speed, capacitance)) return 'noise-unbounded';
    return null;
  };
}

/** The exclusions that only the filter makes, whatever the conditions. */
export function filterExclusions(filter: PartFilter): Exclude {
  const lifecycles = chosen<string>(filter.lifecycle);
  const approvals = chosen<string>(filter.approval);
  const inputTypes = chosen<string | null>(filter.inputType);
  const packageName = filter.package?.trim().toLowerCase();
  const { channels = 0, supply } = filter;
  return (columns, row) => {
    if (lifecycles && !lifecycles.has(columns.lifecycle[row])) return 'lifecycle';
    if (approvals && !approvals.has(columns.approval[row])) return 'approval';
    const [lifecycle, approval] = [columns.lifecycle[row], columns.approval[row]];
    if (isRetiredUnasked({ lifecycle, approval }, filter)) return 'retired';
    if (inputTypes && !inputTypes.has(columns.inputType[row])) return 'input-type';
    if (packageName && !columns.package[row].toLowerCase().includes(packageName)) return 'package';
    const { parameters } = columns;
    if (parameters.channels[row] < channels) return 'too-few-channels';
    const short =
      supply &&
      (parameters.supplyMinimum[row] > supply.minimum || parameters.supplyMaximum[row] < supply.maximum);
    return short ? 'supply-out-of-range' : null;
  };
}

/** The words of a list that narrows; an empty list narrows nothing, as one that is left out. */
function chosen<Word>(words: readonly Word[] | undefined): ReadonlySet<Word> | null {
  return words?.length ? new Set(words) : null;
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
