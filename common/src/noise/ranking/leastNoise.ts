import type { OperatingConditions } from '../../conditions/index.js';
import { fixedPower, outputPower } from '../budget.js';
import { groupAmplifiers } from '../amplifierGroups.js';
import { INTEGRAL, INTEGRALS, type StageModel } from '../stage/model.js';
import { referenceEvaluation } from '../stageFigures.js';
import type { AmplifierColumns } from './columns.js';
import { prepareGenerators } from './generators.js';
import { logarithmicAxis, type Axis } from './lattice.js';
import { preparedColumns } from './preparedColumns.js';

/** An integral between corners a tenth of a decade apart may dip below all of them, but not by this much. */
const DIP = 0.95;

/** Lower bounds in V (A in a transimpedance stage), in the order of the rows. */
export interface LeastNoise {
  /** of the input noise rms */
  total: Float64Array;
  /** of the part of it that source and resistors make */
  fixed: Float64Array;
}

/**
 * A lower bound of each row's input noise rms, without integrating for each row: the sums over the band
 * depend on the amplifier only through gain–bandwidth product and input capacitance, so that the least
 * of a lattice cell's corners serves all rows in it; the signal gain is each row's own.
 */
export function leastNoise(
  conditions: OperatingConditions,
  model: StageModel,
  columns: AmplifierColumns,
  rows: Uint32Array,
): LeastNoise {
  const { gainBandwidth, inputCapacitance } = preparedColumns(columns);
  const speeds = logarithmicAxis(gainBandwidth, rows, Infinity);
  const loads = logarithmicAxis(inputCapacitance, rows, 0);
  const leastIn = leastIntegrals(conditions, model, speeds, loads);
  const generatorsAt = prepareGenerators(conditions, columns);
  const atReference = referenceEvaluation(conditions, model);
  const spot = new Float64Array(INTEGRALS);
  const total = new Float64Array(rows.length);
  const fixed = new Float64Array(rows.length);
  for (let position = 0; position < rows.length; position++) {
    const row = rows[position];
    const integrals = leastIn(speeds.cellOf(gainBandwidth[row]), loads.cellOf(inputCapacitance[row]));
    atReference(gainBandwidth[row], inputCapacitance[row], spot);
    const gain2 = spot[INTEGRAL.source];
    total[position] = Math.sqrt(outputPower(integrals, generatorsAt(row)) / gain2);
    fixed[position] = Math.sqrt(fixedPower(integrals) / gain2);
  }
  return { total, fixed };
}

/** The least integrals of a cell; found at the first asking. */
function leastIntegrals(conditions: OperatingConditions, model: StageModel, speeds: Axis, loads: Axis) {
  const atCorner = cornerIntegrals(conditions, model, speeds, loads);
  const cells: Float64Array[] = [];
  return (speed: number, load: number): Float64Array =>
    (cells[speed * loads.corners.length + load] ??= leastOf(
      speeds.cornersOf(speed).flatMap((s) => loads.cornersOf(load).map((l) => atCorner(s, l))),
    ));
}

function leastOf(corners: Float64Array[]): Float64Array {
  return corners[0].map((_, integral) => DIP * Math.min(...corners.map((corner) => corner[integral])));
}

function cornerIntegrals(conditions: OperatingConditions, model: StageModel, speeds: Axis, loads: Axis) {
  const width = loads.corners.length;
  const gainBandwidth = speeds.corners.flatMap((speed) => loads.corners.map(() => speed));
  const inputCapacitance = speeds.corners.flatMap(() => loads.corners);
  const integrals: Float64Array[] = [];
  const all = gainBandwidth.map((_, corner) => corner);
  for (const group of groupAmplifiers(conditions, model, { gainBandwidth, inputCapacitance }, all)) {
    for (const corner of group.rows) {
      integrals[corner] = new Float64Array(INTEGRALS);
      group.evaluate(gainBandwidth[corner], inputCapacitance[corner], integrals[corner]);
    }
  }
  return (speed: number, load: number) => integrals[speed * width + load];
}
