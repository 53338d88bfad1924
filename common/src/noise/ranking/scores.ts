import type { OperatingConditions } from '../../conditions/index.js';
import { groupAmplifiers, type AmplifierGroup } from '../amplifierGroups.js';
import { outputPower, totalSpread } from '../budget.js';
import { INTEGRAL, INTEGRALS, type Evaluate, type StageModel } from '../stage/model.js';
import { referenceEvaluation } from '../stageFigures.js';
import type { AmplifierColumns } from './columns.js';
import { prepareGenerators } from './generators.js';
import { preparedColumns } from './preparedColumns.js';

/** The scores of some rows of a library, in the order of `rows`. */
export interface Scores {
  rows: Uint32Array;
  inputNoiseRms: Float64Array;
  /** Relative spread of the total downwards and upwards. */
  spreadBelow: Float64Array;
  spreadAbove: Float64Array;
  /** The sum over the band that the row at each position was scored with. */
  groupOf: Uint32Array;
  groups: AmplifierGroup[];
  atReference: Evaluate;
}

/** Scores every given row in one pass: the parts of the work that no part changes are done once. */
export function scoreRows(
  conditions: OperatingConditions,
  model: StageModel,
  columns: AmplifierColumns,
  rows: Uint32Array,
): Scores {
  const { classes, spreads, ...prepared } = preparedColumns(columns);
  const gainBandwidth = pick(prepared.gainBandwidth, rows);
  const inputCapacitance = pick(prepared.inputCapacitance, rows);
  const generatorsAt = prepareGenerators(conditions, columns);
  const integrals = new Float64Array(INTEGRALS);
  const groups = groupAmplifiers(conditions, model, { gainBandwidth, inputCapacitance });
  const atReference = referenceEvaluation(conditions, model);
  const scores = emptyScores(rows, groups, atReference);
  groups.forEach((group, index) => {
    for (const position of group.rows) {
      const row = rows[position];
      const generators = generatorsAt(row);
      atReference(gainBandwidth[position], inputCapacitance[position], integrals);
      const gain2 = integrals[INTEGRAL.source];
      group.evaluate(gainBandwidth[position], inputCapacitance[position], integrals);
      const power = outputPower(integrals, generators);
      const { below, above } = totalSpread(integrals, generators, spreads[classes.of[row]], power);
      scores.inputNoiseRms[position] = Math.sqrt(power / gain2);
      scores.spreadBelow[position] = below;
      scores.spreadAbove[position] = above;
      scores.groupOf[position] = index;
    }
  });
  return scores;
}

function pick(values: Float64Array, rows: Uint32Array): Float64Array {
  const picked = new Float64Array(rows.length);
  for (let position = 0; position < rows.length; position++) picked[position] = values[rows[position]];
  return picked;
}

function emptyScores(rows: Uint32Array, groups: AmplifierGroup[], atReference: Evaluate): Scores {
  const column = () => new Float64Array(rows.length);
  return {
    rows,
    inputNoiseRms: column(),
    spreadBelow: column(),
    spreadAbove: column(),
    groupOf: new Uint32Array(rows.length),
    groups,
    atReference,
  };
}
