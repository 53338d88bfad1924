import { QUANTITIES } from '@roothertz/common/units';
import type { CurvesPlot } from './curve';

/** A plot as CSV (RFC 4180): x in the first column, a column for each curve, SI units, a point as decimal mark. */
export function plotCsv({ x, y, curves }: CurvesPlot): string {
  const xs = [...new Set(curves.flatMap(({ points }) => points.map((point) => point[0])))];
  xs.sort((one, other) => one - other);
  const values = curves.map(({ points }) => new Map(points));
  const header = [
    heading(x.label, QUANTITIES[x.kind].unit),
    ...curves.map(({ name }) => heading(name, QUANTITIES[y.kind].unit)),
  ];
  const rows = xs.map((value) => [value, ...values.map((of) => of.get(value) ?? '')]);
  return [header.map(cell), ...rows].map((row) => `${row.join(',')}\r\n`).join('');
}

function heading(name: string, unit: string): string {
  return unit === '' ? name : `${name} (${unit})`;
}

/** A spreadsheet takes a text that begins with =, +, − or @ for a formula. */
function cell(text: string): string {
  const harmless = /^[=+\-@\t]/.test(text) ? `'${text}` : text;
  return /[",\r\n]/.test(harmless) ? `"${harmless.replaceAll('"', '""')}"` : harmless;
}
