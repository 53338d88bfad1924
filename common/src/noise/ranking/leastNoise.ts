import type { OperatingConditions } from '../../conditions/index.js';
import { groupAmplifiers } from '../amplifierGroups.js';
import { fixedPower } from '../budget.js';
import { INTEGRAL, INTEGRALS, type StageModel } from '../stage/model.js';
import { referenceEvaluation } from '../stageFigures.js';
import type { AmplifierColumns } from './columns.js';
import { prepareGenerators } from './generators.js';
import { cornersOf, type Lattice } from './lattice.js';
import { preparedColumns } from './preparedColumns.js';

/** An integral between corners a tenth of a decade apart may dip below all of them, but not by this much. */
const DIP = 0.995;

/** What a cell keeps: the fixed power, then what multiplies e_n², e_n²·f_ce, i_n² and i_n²·f_ci. */
const KEPT = 5;

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
  const { gainBandwidth, inputCapacitance, lattice } = preparedColumns(columns);
  const { cellOf } = lattice;
  const least = leastOfCells(conditions, model, lattice, rows);
  const generatorsAt = prepareGenerators(conditions, columns);
  const atReference = referenceEvaluation(conditions, model);
  const spot = new Float64Array(INTEGRALS);
  const total = new Float64Array(rows.length);
  const fixed = new Float64Array(rows.length);
  for (let position = 0; position < rows.length; position++) {
    const row = rows[position];
    const k = cellOf[row] * KEPT;
    const { voltage2, voltageCorner, current2, currentCorner } = generatorsAt(row);
    atReference(gainBandwidth[row], inputCapacitance[row], spot);
    const gain2 = spot[INTEGRAL.source];
    const voltage = voltage2 * (least[k + 1] + voltageCorner * least[k + 2]);
    const current = current2 * (least[k + 3] + currentCorner * least[k + 4]);
    total[position] = Math.sqrt((least[k] + voltage + current) / gain2);
    fixed[position] = Math.sqrt(least[k] / gain2);
  }
  return { total, fixed };
}

/** The least of what each cell keeps, for the cells in which rows lie. */
function leastOfCells(
  conditions: OperatingConditions,
  model: StageModel,
  lattice: Lattice,
  rows: Uint32Array,
): Float64Array {
  const isUsed = new Uint8Array(lattice.speeds.length * lattice.loads.length);
  for (const row of rows) isUsed[lattice.cellOf[row]] = 1;
  const cells = Uint32Array.from(isUsed.keys()).filter((cell) => isUsed[cell] === 1);
  const atCorners = cornerIntegrals(conditions, model, lattice, cells);
  const least = new Float64Array(INTEGRALS);
  const kept = new Float64Array(isUsed.length * KEPT);
  for (const cell of cells) {
    fillLeast(least, atCorners, cornersOf(lattice, cell));
    kept[cell * KEPT] = fixedPower(least);
    kept[cell * KEPT + 1] = least[INTEGRAL.voltageWhite];
    kept[cell * KEPT + 2] = least[INTEGRAL.voltageFlicker];
    kept[cell * KEPT + 3] = least[INTEGRAL.currentSourceWhite] + least[INTEGRAL.currentFeedbackWhite];
    kept[cell * KEPT + 4] = least[INTEGRAL.currentSourceFlicker] + least[INTEGRAL.currentFeedbackFlicker];
  }
  return kept;
}

function fillLeast(least: Float64Array, atCorners: Float64Array, [a, b, c, d]: readonly number[]): void {
  for (let n = 0; n < INTEGRALS; n++) {
    const at = (corner: number) => atCorners[corner * INTEGRALS + n];
    least[n] = DIP * Math.min(at(a), at(b), at(c), at(d));
  }
}

/** The integrals at the corners of the cells, each at its place in the lattice. */
function cornerIntegrals(
  conditions: OperatingConditions,
  model: StageModel,
  lattice: Lattice,
  cells: Uint32Array,
): Float64Array {
  const { speeds, loads } = lattice;
  const isCorner = new Uint8Array(speeds.length * loads.length);
  for (const cell of cells) for (const corner of cornersOf(lattice, cell)) isCorner[corner] = 1;
  const corners = Uint32Array.from(isCorner.keys()).filter((corner) => isCorner[corner] === 1);
  const gainBandwidth = Float64Array.from(corners, (corner) => speeds[Math.floor(corner / loads.length)]);
  const inputCapacitance = Float64Array.from(corners, (corner) => loads[corner % loads.length]);
  const integrals = new Float64Array(isCorner.length * INTEGRALS);
  for (const group of groupAmplifiers(conditions, model, { gainBandwidth, inputCapacitance })) {
    for (const place of group.rows) {
      const from = corners[place] * INTEGRALS;
      group.evaluate(
        gainBandwidth[place],
        inputCapacitance[place],
        integrals.subarray(from, from + INTEGRALS),
      );
    }
  }
  return integrals;
}
