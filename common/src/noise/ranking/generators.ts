import type { OperatingConditions } from '../../conditions/index.js';
import { leastCurrentNoise, temperatureFactors } from '../amplifierNoise.js';
import type { Generators } from '../budget.js';
import type { AmplifierColumns } from './columns.js';
import { preparedColumns } from './preparedColumns.js';

/** The generators of a row at the conditions' temperature; the returned object is used anew for each row. */
export function prepareGenerators(
  { amplifierTemperatureModel: model, ambientTemperature }: OperatingConditions,
  columns: AmplifierColumns,
): (row: number) => Generators {
  const { of: classOf, examples } = preparedColumns(columns).classes;
  const factors = examples.map((row) =>
    temperatureFactors(model, ambientTemperature, columns.inputType[row]),
  );
  const voltageFactors = Float64Array.from(factors, ({ voltage }) => voltage);
  const currentFactors = Float64Array.from(factors, ({ current }) => current);
  const { voltageNoise, voltageNoiseCorner, currentNoise, currentNoiseCorner } = columns.parameters;
  const generators: Generators = { voltage2: 0, voltageCorner: 0, current2: 0, currentCorner: 0 };
  return (row) => {
    const factor = classOf[row];
    const known = currentNoise[row];
    const current = Number.isNaN(known) ? standIn(columns, row) : known;
    generators.voltage2 = voltageNoise[row] * voltageNoise[row] * voltageFactors[factor];
    generators.voltageCorner = voltageNoiseCorner[row] || 0;
    generators.current2 = current * current * currentFactors[factor];
    generators.currentCorner = currentNoiseCorner[row] || 0;
    return generators;
  };
}

function standIn({ inputType, parameters }: AmplifierColumns, row: number): number {
  const bias = parameters.inputBiasCurrent[row];
  return leastCurrentNoise(inputType[row], Number.isNaN(bias) ? null : bias);
}
