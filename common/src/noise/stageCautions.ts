import type { OperatingConditions, PartFilter } from '../conditions/index.js';
import type { NoiseAmplifier } from './amplifierNoise.js';
import type { Caution } from './cautions.js';
import { PARAMETER_TEMPERATURE } from './constants.js';
import type { StageModel } from './stage/model.js';

/** Ω; a feedback network below it loads the output where nothing else is stated (common practice, no source). */
export const LEAST_NETWORK = 500;
/** Minimum stable gains lie up to about here: a stage above it is stable with nearly any op-amp. */
const SAFE_NOISE_GAIN = 10;

/** Op-amps of one type in an instrumentation stage. */
const INSTRUMENTATION_CHANNELS = 3;

/** What makes the figures of this amplifier in this stage less certain than they look. */
export function stageCautions(
  conditions: OperatingConditions,
  model: StageModel,
  amplifier: NoiseAmplifier,
  filter: PartFilter = {},
): Caution[] {
  const { stage, ambientTemperature, amplifierTemperatureModel } = conditions;
  const unknown = (value: number | null | undefined) => value === null || value === undefined;
  const noiseGain = model.crossoverNoiseGain(
    amplifier.gainBandwidth ?? Infinity,
    amplifier.inputCapacitance ?? 0,
  );
  const applies: Record<Caution, boolean> = {
    'current-noise-unknown': unknown(amplifier.currentNoise),
    'corner-unknown': amplifier.voltageNoiseCorner === null || amplifier.currentNoiseCorner === null,
    'bandwidth-unknown': unknown(amplifier.gainBandwidth),
    'capacitance-unknown': amplifier.inputCapacitance === null,
    'estimated-at-temperature':
      amplifierTemperatureModel === 'estimated' && ambientTemperature !== PARAMETER_TEMPERATURE,
    'feedback-network-loads-output': model.networkResistance < (stage.network?.minimumTotal ?? LEAST_NETWORK),
    'stability-unknown': amplifier.minimumStableGain === null && noiseGain < SAFE_NOISE_GAIN,
    'supply-unknown':
      filter.supply !== undefined && (unknown(amplifier.supplyMinimum) || unknown(amplifier.supplyMaximum)),
    'several-packages':
      stage.topology === 'instrumentation' && (amplifier.channels ?? 1) < INSTRUMENTATION_CHANNELS,
  };
  return (Object.keys(applies) as Caution[]).filter((caution) => applies[caution]);
}
