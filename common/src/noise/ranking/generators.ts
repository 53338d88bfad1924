import type { OperatingConditions } from '../../conditions/index.js';
import { leastCurrentNoise, temperatureFactors } from '../amplifierNoise.js';
import type { Generators } from '../budget.js';
import { INPUT_TYPES_OR_UNKNOWN, type AmplifierColumns } from './columns.js';

/** The generators of a row at the conditions' temperature; the returned object is used anew for each row. */
export function prepareGenerators(
  conditions: OperatingConditions,
  columns: AmplifierColumns,
): (row: number) => Generators {
  const { amplifierTemperatureModel: model, ambientTemperature } = conditions;
  const factors = new Map(
    INPUT_TYPES_OR_UNKNOWN.map((type) => [type, temperatureFactors(model, ambientTemperature, type)]),
  );
  const { voltageNoise, voltageNoiseCorner, currentNoise, currentNoiseCorner, inputBiasCurrent } =
    columns.parameters;
  const generators: Generators = { voltage2: 0, voltageCorner: 0, current2: 0, currentCorner: 0 };
  return (row) => {
    const type = columns.inputType[row];
    const factor = factors.get(type)!;
    const bias = inputBiasCurrent[row];
    const known = currentNoise[row];
    const current = Number.isNaN(known) ? leastCurrentNoise(type, Number.isNaN(bias) ? null : bias) : known;
    generators.voltage2 = voltageNoise[row] * voltageNoise[row] * factor.voltage;
    generators.voltageCorner = voltageNoiseCorner[row] || 0;
    generators.current2 = current * current * factor.current;
    generators.currentCorner = currentNoiseCorner[row] || 0;
    return generators;
  };
}
