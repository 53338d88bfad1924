import type { OperatingConditions, RankingRequest } from '../../src/conditions/index.js';
import { emptyColumns, NOISE_PARAMETERS, type AmplifierColumns } from '../../src/noise/index.js';
import {
  OP_AMP_PARAMETERS,
  type Amplifier,
  type AmplifierOrigins,
  type Approval,
  type Lifecycle,
} from '../../src/parts/index.js';
import type { KnownAmplifier } from './nodalAnalysis.js';

type Changes<T> = { [Key in keyof T]?: T[Key] extends object | undefined ? Changes<T[Key]> : T[Key] };

/** A follower on 1 kΩ from 20 Hz to 20 kHz at 290 K, amplifier parameters as given; with changes. */
export function conditionsWith(changes: Changes<OperatingConditions> = {}): OperatingConditions {
  return {
    ambientTemperature: 290,
    referenceFrequency: 1000,
    bandwidthMargin: 3,
    amplifierTemperatureModel: 'none',
    ...changes,
    source: { resistance: 1000, inductance: 0, capacitance: 0, ...changes.source },
    band: { lower: 20, upper: 20e3, lowPassOrder: 0, ...changes.band },
    stage: { topology: 'non-inverting', gain: 1, ...changes.stage } as OperatingConditions['stage'],
  };
}

/** The same conditions as a request to be checked. */
export function requestWith(
  changes: Changes<OperatingConditions> = {},
  rest: Omit<RankingRequest, 'conditions'> = {},
): RankingRequest {
  return { conditions: conditionsWith(changes), ...rest };
}

/** An amplifier so quiet that it counts as none: 1e-18 V/√Hz, no current noise, infinitely fast. */
export const SILENT: KnownAmplifier = {
  voltageNoise: 1e-18,
  voltageNoiseCorner: 0,
  currentNoise: 0,
  currentNoiseCorner: 0,
  gainBandwidth: null,
  inputCapacitance: 0,
};

/** An amplifier with everything known; with changes. */
export function amplifierWith(changes: Partial<Amplifier> = {}): Amplifier {
  return {
    inputType: 'bipolar',
    channels: 1,
    voltageNoise: 3e-9,
    voltageNoiseCorner: 10,
    currentNoise: 1e-12,
    currentNoiseCorner: 100,
    gainBandwidth: 1e7,
    inputCapacitance: 5e-12,
    inputBiasCurrent: 1e-8,
    minimumStableGain: 1,
    supplyMinimum: 5,
    supplyMaximum: 36,
    supplyCurrent: 3e-3,
    ...changes,
  };
}

/** What a library holds of a part beside its parameters. */
export interface LibraryPart {
  amplifier: Amplifier;
  origins?: AmplifierOrigins;
  lifecycle?: Lifecycle;
  approval?: Approval;
  package?: string;
  name?: string;
}

/** Parts as the columns that are ranked. */
export function libraryOf(parts: readonly LibraryPart[]): AmplifierColumns {
  const columns = emptyColumns(parts.length);
  parts.forEach(({ amplifier, origins = {}, ...part }, row) => {
    for (const { key } of OP_AMP_PARAMETERS) columns.parameters[key][row] = amplifier[key] ?? NaN;
    columns.inputType[row] = amplifier.inputType;
    for (const key of NOISE_PARAMETERS) columns.origins[key][row] = origins[key] ?? 'typical';
    columns.lifecycle[row] = part.lifecycle ?? 'active';
    columns.approval[row] = part.approval ?? 'approved';
    columns.package[row] = part.package ?? '';
    columns.searchText[row] = part.name ?? '';
  });
  return columns;
}
