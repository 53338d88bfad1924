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
  return csvText(header, rows);
}

/** Headings and rows as CSV (RFC 4180). */
export function csvText(header: readonly string[], rows: readonly (readonly (string | number)[])[]): string {
  const texts = rows.map((row) => row.map((value) => (typeof value === 'string' ? cell(value) : value)));
  return [header.map(cell), ...texts].map((row) => `${row.join(',')}\r\n`).join('');
}

/** A column's heading with its unit. */
export function heading(name: string, unit: string): string {
  return unit === '' ? name : `${name} (${unit})`;
}

/** A spreadsheet takes a text that begins with =, +, − or @ for a formula. */
function cell(text: string): string {
  const harmless = /^[=+\-@\t]/.test(text) ? `'${text}` : text;
  return /[",\r\n]/.test(harmless) ? `"${harmless.replaceAll('"', '""')}"` : harmless;
}
