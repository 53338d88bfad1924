import type { OperatingConditions } from '../../conditions/index.js';
import { groupAmplifiers, type AmplifierGroup } from '../amplifierGroups.js';
import { outputPower, totalSpread } from '../budget.js';
import type { Spread } from '../relativeSpread.js';
import { INTEGRAL, INTEGRALS, type Evaluate, type StageModel } from '../stage/model.js';
import { referenceEvaluation } from '../stageFigures.js';
import type { AmplifierColumns } from './columns.js';
import { prepareGenerators } from './generators.js';
import { preparedColumns } from './preparedColumns.js';

/** The scores of some rows of a library, in the order of `rows`. */
export interface Scores {
  rows: Uint32Array;
  inputNoiseRms: Float64Array;
  /** The sum over the band that the row at each position was scored with. */
  groupOf: Uint32Array;
  groups: AmplifierGroup[];
  atReference: Evaluate;
  /** Relative spread of the total at a position. */
  spreadAt(position: number): Spread;
  /** What the spread downwards can be at most, without summing over the band. */
  spreadLimitAt(position: number): number;
}

/** Scores every given row in one pass: the parts of the work that no part changes are done once. */
export function scoreRows(
  conditions: OperatingConditions,
  model: StageModel,
  columns: AmplifierColumns,
  rows: Uint32Array,
): Scores {
  const { gainBandwidth, inputCapacitance, spreadLimit } = preparedColumns(columns);
  const generatorsAt = prepareGenerators(conditions, columns);
  const integrals = new Float64Array(INTEGRALS);
  const groups = groupAmplifiers(conditions, model, { gainBandwidth, inputCapacitance }, rows);
  const atReference = referenceEvaluation(conditions, model);
  const positions = new Uint32Array(columns.count);
  rows.forEach((row, position) => (positions[row] = position));
  const scores: Scores = {
    rows,
    inputNoiseRms: new Float64Array(rows.length),
    groupOf: new Uint32Array(rows.length),
    groups,
    atReference,
    spreadLimitAt: (position) => spreadLimit[rows[position]],
    spreadAt(position) {
      const row = rows[position];
      const generators = generatorsAt(row);
      groups[scores.groupOf[position]].evaluate(gainBandwidth[row], inputCapacitance[row], integrals);
      return totalSpread(integrals, generators, originsAt(columns, row), outputPower(integrals, generators));
    },
  };
  groups.forEach((group, index) => {
    for (const row of group.rows) {
      const position = positions[row];
      atReference(gainBandwidth[row], inputCapacitance[row], integrals);
      const gain2 = integrals[INTEGRAL.source];
      group.evaluate(gainBandwidth[row], inputCapacitance[row], integrals);
      scores.inputNoiseRms[position] = Math.sqrt(outputPower(integrals, generatorsAt(row)) / gain2);
      scores.groupOf[position] = index;
    }
  });
  return scores;
}

function originsAt({ origins }: AmplifierColumns, row: number) {
  return {
    voltageNoise: origins.voltageNoise[row],
    voltageNoiseCorner: origins.voltageNoiseCorner[row],
    currentNoise: origins.currentNoise[row],
    currentNoiseCorner: origins.currentNoiseCorner[row],
  };
}
