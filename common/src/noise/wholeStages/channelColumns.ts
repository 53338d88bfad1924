import { leastCurrentNoise } from '../amplifierNoise.js';
import type { AmplifierColumns } from '../ranking/columns.js';

/** A library in which each op-amp is what `parallelStage` makes of it with `count` channels. */
export function channelColumns(columns: AmplifierColumns, count: number): AmplifierColumns {
  if (count === 1) return columns;
  const { parameters } = columns;
  return {
    ...columns,
    parameters: {
      ...parameters,
      voltageNoise: parameters.voltageNoise.map((noise) => noise / Math.sqrt(count)),
      currentNoise: knownCurrentNoise(columns).map((noise) => noise * Math.sqrt(count)),
      inputCapacitance: parameters.inputCapacitance.map((capacitance) => capacitance * count),
    },
  };
}

function knownCurrentNoise({ parameters, inputType }: AmplifierColumns): Float64Array {
  const { currentNoise, inputBiasCurrent } = parameters;
  return currentNoise.map((noise, row) => {
    if (!Number.isNaN(noise)) return noise;
    const bias = inputBiasCurrent[row];
    return leastCurrentNoise(inputType[row], Number.isNaN(bias) ? null : bias);
  });
}
