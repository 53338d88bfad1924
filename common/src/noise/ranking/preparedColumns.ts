import { ORIGIN_SPREAD } from '../relativeSpread.js';
import { NOISE_PARAMETERS, type AmplifierColumns } from './columns.js';

/** What a library's columns tell whatever the conditions: made once for all rankings of the library. */
export interface PreparedColumns {
  /** Hz; Infinity where unknown */
  gainBandwidth: Float64Array;
  /** F; 0 where unknown */
  inputCapacitance: Float64Array;
  /** No total of the row can have a larger relative spread downwards. */
  spreadLimit: Float64Array;
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
export const SPREAD_GROWTH = Math.sqrt(1.25);

function prepare({ count, parameters, origins }: AmplifierColumns): PreparedColumns {
  const gainBandwidth = new Float64Array(count);
  const inputCapacitance = new Float64Array(count);
  const spreadLimit = new Float64Array(count);
  for (let row = 0; row < count; row++) {
    const speed = parameters.gainBandwidth[row];
    gainBandwidth[row] = Number.isNaN(speed) ? Infinity : speed;
    inputCapacitance[row] = parameters.inputCapacitance[row] || 0;
    const below = NOISE_PARAMETERS.map((parameter) => ORIGIN_SPREAD[origins[parameter][row]].below);
    spreadLimit[row] = SPREAD_GROWTH * Math.max(...below);
  }
  return { gainBandwidth, inputCapacitance, spreadLimit };
}
