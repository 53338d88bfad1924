import type { OperatingConditions } from '../../conditions/index.js';
import { groupAmplifiers, type AmplifierGroup } from '../amplifierGroups.js';
import { temperatureFactors, leastCurrentNoise } from '../amplifierNoise.js';
import { outputPower, totalSpread, type Generators } from '../budget.js';
import type { Spread } from '../relativeSpread.js';
import { referenceEvaluation } from '../stageFigures.js';
import { INTEGRAL, INTEGRALS, type Evaluate, type StageModel } from '../stage/model.js';
import { INPUT_TYPES_OR_UNKNOWN, type AmplifierColumns } from './columns.js';

/** The scores of a library's ranked rows, in the order of `rows`. */
export interface Scores {
  rows: Uint32Array;
  inputNoiseRms: Float64Array;
  /** The sum over the band that the row at each position was scored with. */
  groupOf: Uint32Array;
  groups: AmplifierGroup[];
  atReference: Evaluate;
  /** Relative spread of the total at a position. */
  spreadAt(position: number): Spread;
}

/** Scores every given row in one pass: the parts of the work that no part changes are done once. */
export function scoreRows(
  conditions: OperatingConditions,
  model: StageModel,
  columns: AmplifierColumns,
  rows: Uint32Array,
): Scores {
  const dynamics = dynamicColumns(columns);
  const generatorsAt = prepareGenerators(conditions, columns);
  const integrals = new Float64Array(INTEGRALS);
  const groups = groupAmplifiers(conditions, model, dynamics, rows);
  const atReference = referenceEvaluation(conditions, model);
  const positions = new Uint32Array(columns.count);
  rows.forEach((row, position) => (positions[row] = position));
  const scores: Scores = {
    rows,
    inputNoiseRms: new Float64Array(rows.length),
    groupOf: new Uint32Array(rows.length),
    groups,
    atReference,
    spreadAt(position) {
      const row = rows[position];
      const generators = generatorsAt(row);
      const { evaluate } = groups[scores.groupOf[position]];
      evaluate(dynamics.gainBandwidth[row], dynamics.inputCapacitance[row], integrals);
      return totalSpread(integrals, generators, originsAt(columns, row), outputPower(integrals, generators));
    },
  };
  groups.forEach((group, index) => {
    for (const row of group.rows) {
      const position = positions[row];
      const generators = generatorsAt(row);
      const gainBandwidth = dynamics.gainBandwidth[row];
      const inputCapacitance = dynamics.inputCapacitance[row];
      atReference(gainBandwidth, inputCapacitance, integrals);
      const gain2 = integrals[INTEGRAL.source];
      group.evaluate(gainBandwidth, inputCapacitance, integrals);
      const power = outputPower(integrals, generators);
      scores.inputNoiseRms[position] = Math.sqrt(power / gain2);
      scores.groupOf[position] = index;
    }
  });
  return scores;
}

function dynamicColumns({ count, parameters }: AmplifierColumns) {
  const gainBandwidth = new Float64Array(count);
  const inputCapacitance = new Float64Array(count);
  for (let row = 0; row < count; row++) {
    const speed = parameters.gainBandwidth[row];
    gainBandwidth[row] = Number.isNaN(speed) ? Infinity : speed;
    inputCapacitance[row] = parameters.inputCapacitance[row] || 0;
  }
  return { gainBandwidth, inputCapacitance };
}

/** The generators of a row at the conditions' temperature; the returned object is used anew for each row. */
function prepareGenerators(conditions: OperatingConditions, columns: AmplifierColumns) {
  const { amplifierTemperatureModel: model, ambientTemperature } = conditions;
  const factors = new Map(
    INPUT_TYPES_OR_UNKNOWN.map((type) => [type, temperatureFactors(model, ambientTemperature, type)]),
  );
  const { voltageNoise, voltageNoiseCorner, currentNoise, currentNoiseCorner, inputBiasCurrent } =
    columns.parameters;
  const generators: Generators = { voltage2: 0, voltageCorner: 0, current2: 0, currentCorner: 0 };
  return (row: number): Generators => {
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

function originsAt({ origins }: AmplifierColumns, row: number) {
  return {
    voltageNoise: origins.voltageNoise[row],
    voltageNoiseCorner: origins.voltageNoiseCorner[row],
    currentNoise: origins.currentNoise[row],
    currentNoiseCorner: origins.currentNoiseCorner[row],
  };
}
