import { ORIGIN_SPREAD } from '../relativeSpread.js';
import type { NoiseSpreads } from '../budget.js';
import { NOISE_PARAMETERS, type AmplifierColumns } from './columns.js';
import { latticeOf, type Lattice } from './lattice.js';
import { classifyParts, type PartClasses } from './partClasses.js';

/** What a library's columns tell whatever the conditions: made once for all rankings of the library. */
export interface PreparedColumns {
  /** Hz; Infinity where unknown */
  gainBandwidth: Float64Array;
  /** F; 0 where unknown */
  inputCapacitance: Float64Array;
  /** F, of all rows */
  leastCapacitance: number;
  /** F, of all rows */
  greatestCapacitance: number;
  lattice: Lattice;
  classes: PartClasses;
  /** The spreads of each class's noise parameters. */
  spreads: NoiseSpreads[];
  /** No total of a row of each class can have a larger relative spread downwards. */
  spreadLimits: Float64Array;
}

const PREPARED = new WeakMap<AmplifierColumns, PreparedColumns>();

/** The prepared columns of a library, from the second time on as they were. */
export function preparedColumns(columns: AmplifierColumns): PreparedColumns {
  const known = PREPARED.get(columns);
  if (known) return known;
  const prepared = prepare(columns);
  PREPARED.set(columns, prepared);
  return prepared;
}

/**
 * The most by which spreads of equal size s in all parameters can spread a total: a 1/f share of one
 * counts once with its density and half with its corner, √(1 + ¼)·s.
 */
const SPREAD_GROWTH = Math.sqrt(1.25);

function prepare(columns: AmplifierColumns): PreparedColumns {
  const { parameters, origins } = columns;
  const gainBandwidth = parameters.gainBandwidth.map((speed) => (Number.isNaN(speed) ? Infinity : speed));
  const inputCapacitance = parameters.inputCapacitance.map((capacitance) => capacitance || 0);
  const classes = classifyParts(columns);
  const spreads = classes.examples.map(
    (row) =>
      Object.fromEntries(
        NOISE_PARAMETERS.map((key) => [key, ORIGIN_SPREAD[origins[key][row]]]),
      ) as unknown as NoiseSpreads,
  );
  const widest = (spread: NoiseSpreads) => Math.max(...Object.values(spread).map(({ below }) => below));
  return {
    gainBandwidth,
    inputCapacitance,
    leastCapacitance: inputCapacitance.reduce((a, b) => Math.min(a, b), Infinity),
    greatestCapacitance: inputCapacitance.reduce((a, b) => Math.max(a, b), 0),
    lattice: latticeOf(gainBandwidth, inputCapacitance),
    classes,
    spreads,
    spreadLimits: Float64Array.from(spreads, (spread) => SPREAD_GROWTH * widest(spread)),
  };
}
