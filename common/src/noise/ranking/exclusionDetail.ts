import type { OperatingConditions, PartFilter } from '../../conditions/index.js';
import {
  APPROVAL_LABELS,
  INPUT_TYPE_LABELS,
  LIFECYCLE_LABELS,
  RETIRED_DETAIL,
  type Amplifier,
} from '../../parts/index.js';
import { formatQuantity } from '../../units/index.js';
import type { ExclusionReason } from '../cautions.js';
import { stageModel } from '../stage/stageModel.js';
import { closedLoopBandwidth } from '../stageFigures.js';
import { amplifierAt, type AmplifierColumns } from './columns.js';

interface Excluded {
  conditions: OperatingConditions;
  filter: PartFilter;
  columns: AmplifierColumns;
  row: number;
  amplifier: Amplifier;
}

const DETAILS: Record<ExclusionReason, (excluded: Excluded) => string> = {
  lifecycle: ({ columns, row }) => `its lifecycle is “${LIFECYCLE_LABELS[columns.lifecycle[row]]}”`,
  approval: ({ columns, row }) => `its approval is “${APPROVAL_LABELS[columns.approval[row]]}”`,
  retired: () => RETIRED_DETAIL,
  'input-type': ({ amplifier }) =>
    amplifier.inputType
      ? `its input is ${INPUT_TYPE_LABELS[amplifier.inputType]}`
      : 'its input type is unknown',
  package: ({ columns, row }) => `its package is ${columns.package[row] || 'unknown'}`,
  'too-few-channels': ({ amplifier, filter }) =>
    `it has ${amplifier.channels} of the ${filter.channels} channels needed`,
  'supply-out-of-range': ({ amplifier, filter }) =>
    `works from ${volts(amplifier.supplyMinimum)} to ${volts(amplifier.supplyMaximum)}, ` +
    `the stage is supplied with ${volts(filter.supply!.minimum)} to ${volts(filter.supply!.maximum)}`,
  'below-minimum-stable-gain': ({ amplifier, conditions }) =>
    `stable from a noise gain of ${amplifier.minimumStableGain} on, this stage has ${noiseGainText(conditions, amplifier)}`,
  'too-slow': ({ amplifier, conditions }) =>
    `too slow: closed-loop bandwidth ${hertz(bandwidthOf(conditions, amplifier))}, ` +
    `band needs ${hertz(conditions.bandwidthMargin * conditions.band.upper)}`,
  'noise-unbounded': () =>
    'its gain–bandwidth product is unknown, and without it the noise of this stage rises beyond what a first-order low-pass takes away: state it, or choose a second-order low-pass',
};

/** Why the part at a row is excluded, in plain words with figures. */
export function exclusionDetail(
  reason: ExclusionReason,
  conditions: OperatingConditions,
  filter: PartFilter,
  columns: AmplifierColumns,
  row: number,
): string {
  return DETAILS[reason]({ conditions, filter, columns, row, amplifier: amplifierAt(columns, row) });
}

function volts(value: number | null): string {
  return value === null ? 'an unknown voltage' : formatQuantity(value, 'voltage', { trim: true });
}

function hertz(value: number): string {
  return formatQuantity(value, 'frequency', { trim: true });
}

function bandwidthOf(conditions: OperatingConditions, amplifier: Amplifier): number {
  return (
    closedLoopBandwidth(conditions, stageModel(conditions), {
      gainBandwidth: amplifier.gainBandwidth ?? Infinity,
      inputCapacitance: amplifier.inputCapacitance ?? 0,
    }) ?? Infinity
  );
}

function noiseGainText(conditions: OperatingConditions, amplifier: Amplifier): string {
  const noiseGain = stageModel(conditions).crossoverNoiseGain(
    amplifier.gainBandwidth ?? Infinity,
    amplifier.inputCapacitance ?? 0,
  );
  return formatQuantity(noiseGain, 'gain', { trim: true });
}
