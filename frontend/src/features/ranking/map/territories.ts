/** A cell of the map: which resistance, which frequency. */
export interface Cell {
  column: number;
  row: number;
}

/** Adjoining cells with the same quietest part. */
export interface Territory {
  /** Index into the map's parts; −1 = no part. */
  part: number;
  cells: Cell[];
}

/** The territories of a map, the largest first. */
export function territoriesOf(winners: readonly (readonly number[])[]): Territory[] {
  const seen = winners.map((column) => column.map(() => false));
  const territories: Territory[] = [];
  winners.forEach((rows, column) =>
    rows.forEach((part, row) => {
      if (!seen[column][row]) territories.push({ part, cells: flood(winners, seen, { column, row }) });
    }),
  );
  return territories.sort((one, other) => other.cells.length - one.cells.length);
}

function flood(winners: readonly (readonly number[])[], seen: boolean[][], start: Cell): Cell[] {
  const part = winners[start.column][start.row];
  const cells: Cell[] = [start];
  seen[start.column][start.row] = true;
  for (const { column, row } of cells)
    for (const [right, up] of NEIGHBOURS) {
      const next = { column: column + right, row: row + up };
      if (winners[next.column]?.[next.row] !== part || seen[next.column][next.row]) continue;
      seen[next.column][next.row] = true;
      cells.push(next);
    }
  return cells;
}

const NEIGHBOURS = [
  [1, 0],
  [-1, 0],
  [0, 1],
  [0, -1],
] as const;

/**
 * Where a label of so many cells fits into a territory, nearest to its middle: the middle of the label in
 * cells from the map's lower left corner; null where it fits nowhere.
 */
export function labelSpot({ cells }: Territory, wide: number, high: number): { x: number; y: number } | null {
  const own = new Set(cells.map(keyOf));
  const middle = { x: mean(cells.map(({ column }) => column)), y: mean(cells.map(({ row }) => row)) };
  const [columns, rows] = [Math.ceil(wide), Math.ceil(high)];
  const spots = cells
    .filter((cell) => holds(own, cell, columns, rows))
    .map(({ column, row }) => ({ x: column + columns / 2, y: row + rows / 2 }));
  const far = ({ x, y }: { x: number; y: number }) => Math.hypot(x - 0.5 - middle.x, y - 0.5 - middle.y);
  return spots.reduce<{ x: number; y: number } | null>(
    (best, spot) => (best === null || far(spot) < far(best) ? spot : best),
    null,
  );
}

function holds(own: ReadonlySet<string>, { column, row }: Cell, columns: number, rows: number): boolean {
  for (let right = 0; right < columns; right++)
    for (let up = 0; up < rows; up++)
      if (!own.has(keyOf({ column: column + right, row: row + up }))) return false;
  return true;
}

function keyOf({ column, row }: Cell): string {
  return `${column} ${row}`;
}

function mean(values: readonly number[]): number {
  return values.reduce((sum, value) => sum + value, 0) / values.length;
}
