/** Ratio of neighbouring corners: ten to a decade. */
const RATIO = 10 ** 0.1;

/**
 * One axis of a lattice in the logarithm of a positive parameter, with a place apart for the value that
 * has no logarithm (0 or Infinity). Cell 0 holds that value alone; cell n lies between corners n and n + 1.
 */
interface Axis {
  corners: number[];
  cellOf(value: number): number;
}

/** The cells of a library's op-amps, a tenth of a decade wide, in gain–bandwidth product and input capacitance. */
export interface Lattice {
  /** Hz; Infinity = ideal */
  speeds: number[];
  /** F */
  loads: number[];
  /** The cell of each row: that of its speed times the number of loads, plus that of its load. */
  cellOf: Uint32Array;
}

/**
 * The lattice whose corners enclose all values of a library.
 *
 * @param gainBandwidth Hz, > 0; Infinity = ideal
 * @param inputCapacitance F, ≥ 0
 */
export function latticeOf(gainBandwidth: Float64Array, inputCapacitance: Float64Array): Lattice {
  const speeds = logarithmicAxis(gainBandwidth, Infinity);
  const loads = logarithmicAxis(inputCapacitance, 0);
  const width = loads.corners.length;
  const cellOf = new Uint32Array(gainBandwidth.length);
  for (let row = 0; row < cellOf.length; row++)
    cellOf[row] = speeds.cellOf(gainBandwidth[row]) * width + loads.cellOf(inputCapacitance[row]);
  return { speeds: speeds.corners, loads: loads.corners, cellOf };
}

/** The corners that enclose a cell, counted like the cells; where one parameter is apart, each stands twice. */
export function cornersOf({ loads }: Lattice, cell: number): [number, number, number, number] {
  const width = loads.length;
  const nextLoad = cell % width === 0 ? 0 : 1;
  const nextSpeed = cell < width ? 0 : width;
  return [cell, cell + nextLoad, cell + nextSpeed, cell + nextSpeed + nextLoad];
}

function logarithmicAxis(values: Float64Array, apart: number): Axis {
  let least = Infinity;
  let most = 0;
  for (const value of values) {
    if (value === apart) continue;
    if (value < least) least = value;
    if (value > most) most = value;
  }
  const corners = [apart];
  const cells = most === 0 ? 0 : Math.floor(Math.log(most / least) / Math.log(RATIO)) + 1;
  if (cells > 0) for (let n = 0; n <= cells; n++) corners.push(least * RATIO ** n);
  const perNeper = 1 / Math.log(RATIO);
  return {
    corners,
    cellOf: (value) =>
      value === apart ? 0 : Math.min(cells, 1 + Math.floor(Math.log(value / least) * perNeper)),
  };
}
