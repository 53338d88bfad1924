import type { QuietestMap } from '../../../api/quietestMap';
import type { Cell } from './territories';

export const MAP_WIDTH = 336;
export const MAP_HEIGHT = 372;
const [LEFT, RIGHT, TOP, BOTTOM] = [44, 8, 22, 36];

/** The map's field in pixels, and how cells and values lie in it. */
export interface MapGeometry {
  left: number;
  right: number;
  top: number;
  bottom: number;
  cellWidth: number;
  cellHeight: number;
  xOf: (resistance: number) => number;
  yOf: (frequency: number) => number;
  /** The cell at a point, the nearest one where it lies outside. */
  cellAt: (x: number, y: number) => Cell;
}

/** Each value stands in the middle of its cells; frequencies rise upwards. */
export function mapGeometry({ resistances, frequencies }: QuietestMap): MapGeometry {
  const [right, bottom] = [MAP_WIDTH - RIGHT, MAP_HEIGHT - BOTTOM];
  const cellWidth = (right - LEFT) / resistances.length;
  const cellHeight = (bottom - TOP) / frequencies.length;
  const column = placeOn(resistances);
  const row = placeOn(frequencies);
  const clamped = (value: number, count: number) => Math.min(count - 1, Math.max(0, Math.floor(value)));
  return {
    left: LEFT,
    right,
    top: TOP,
    bottom,
    cellWidth,
    cellHeight,
    xOf: (resistance) => LEFT + (column(resistance) + 0.5) * cellWidth,
    yOf: (frequency) => bottom - (row(frequency) + 0.5) * cellHeight,
    cellAt: (x, y) => ({
      column: clamped((x - LEFT) / cellWidth, resistances.length),
      row: clamped((bottom - y) / cellHeight, frequencies.length),
    }),
  };
}

/** Steps along a logarithmic axis, held at its ends. */
function placeOn(points: readonly number[]): (value: number) => number {
  const last = points.length - 1;
  const [from, to] = [points[0], points[last]];
  return (value) =>
    value <= from ? 0 : Math.min(last, (last * Math.log(value / from)) / Math.log(to / from));
}

/** The whole decades on an axis. */
export function decadesOn(points: readonly number[]): number[] {
  const first = Math.ceil(Math.log10(points[0]) - 1e-9);
  const last = Math.floor(Math.log10(points[points.length - 1]) + 1e-9);
  return Array.from({ length: last - first + 1 }, (_none, step) => Number(`1e${first + step}`));
}

/** The outline of cells, as the path of a surface. */
export function surfacePath(cells: readonly Cell[], geometry: MapGeometry): string {
  const { left, bottom, cellWidth, cellHeight } = geometry;
  return cells
    .map(({ column, row }) => {
      const [x, y] = [left + column * cellWidth, bottom - (row + 1) * cellHeight];
      return `M${fixed(x)} ${fixed(y)}h${fixed(cellWidth)}v${fixed(cellHeight)}H${fixed(x)}z`;
    })
    .join('');
}

/** The lines between cells of different parts; only those around one part where it is given. */
export function borderPath(
  winners: readonly (readonly number[])[],
  { left, bottom, cellWidth, cellHeight }: MapGeometry,
  part?: number,
): string {
  const parts = winners.flatMap((rows, column) =>
    rows.map((winner, row) => {
      const [x, y] = [left + (column + 1) * cellWidth, bottom - (row + 1) * cellHeight];
      const isBorder = (other: number | undefined) =>
        other !== undefined && other !== winner && (part === undefined || winner === part || other === part);
      const atRight = isBorder(winners[column + 1]?.[row]);
      const above = isBorder(rows[row + 1]);
      return (
        (atRight ? `M${fixed(x)} ${fixed(y)}v${fixed(cellHeight)}` : '') +
        (above ? `M${fixed(x - cellWidth)} ${fixed(y)}h${fixed(cellWidth)}` : '')
      );
    }),
  );
  return parts.join('');
}

function fixed(value: number): string {
  return String(Number(value.toFixed(2)));
}
