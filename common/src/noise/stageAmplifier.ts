import type { OperatingConditions } from '../conditions/index.js';
import { leastCurrentNoise, temperatureFactors, type NoiseAmplifier } from './amplifierNoise.js';
import type { StageAmplifier } from './stageFigures.js';

/** An amplifier at the conditions' temperature, with stand-ins for what is unknown. */
export function stageAmplifier(
  { amplifierTemperatureModel, ambientTemperature }: OperatingConditions,
  amplifier: NoiseAmplifier,
): StageAmplifier {
  const inputType = amplifier.inputType ?? null;
  const factors = temperatureFactors(amplifierTemperatureModel, ambientTemperature, inputType);
  const currentNoise =
    amplifier.currentNoise ?? leastCurrentNoise(inputType, amplifier.inputBiasCurrent ?? null);
  return {
    gainBandwidth: amplifier.gainBandwidth ?? Infinity,
    inputCapacitance: amplifier.inputCapacitance ?? 0,
    voltage2: amplifier.voltageNoise ** 2 * factors.voltage,
    voltageCorner: amplifier.voltageNoiseCorner ?? 0,
    current2: currentNoise ** 2 * factors.current,
    currentCorner: amplifier.currentNoiseCorner ?? 0,
  };
}
