/** Ratio of neighbouring corners: ten to a decade. */
const RATIO = 10 ** 0.1;

/**
 * One axis of a lattice in the logarithm of a positive parameter, with a place apart for the value that
 * has no logarithm (0 or Infinity). Cell 0 holds that value alone; cell n lies between corners n and n + 1.
 */
export interface Axis {
  corners: number[];
  cellOf(value: number): number;
  /** The corners that enclose a cell. */
  cornersOf(cell: number): number[];
}

/**
 * The axis that the given rows of a column need: its corners enclose all their values, a tenth of a decade from each
 * to the next.
 *
 * @param values > 0, but for `apart`
 * @param apart the value that has a place of its own
 */
export function logarithmicAxis(values: Float64Array, rows: Uint32Array, apart: number): Axis {
  let least = Infinity;
  let most = 0;
  for (const row of rows) {
    const value = values[row];
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
    cornersOf: (cell) => (cell === 0 ? [0] : [cell, cell + 1]),
  };
}
