import type { Reading } from '../../parts/index.js';
import { isDay } from '../../prices/index.js';

const YEAR_FIRST = /^(\d{4})[-/.](\d{1,2})[-/.](\d{1,2})(?:[T ]00:00(?::00(?:\.0+)?)?Z?)?$/;
const YEAR_LAST = /^(\d{1,2})([-/.])(\d{1,2})\2(\d{4})$/;

/**
 * Reads a day as lists write it: 2026-12-31, 2026/12/31, 31.12.2026, 31/12/2026, 12/31/2026. Where slashes or
 * hyphens leave open which number is the month, it is refused.
 */
export function readDay(label: string, cell: string): Reading<string> {
  const text = cell.trim();
  const [, year, month, date] = YEAR_FIRST.exec(text) ?? [];
  if (year !== undefined) return dayOfParts(label, year, month, date);
  const [, first, mark, second, last] = YEAR_LAST.exec(text) ?? [];
  if (last === undefined) return { ok: false, message: `${label}: a day such as 2026-12-31 was expected` };
  if (mark === '.' || Number(first) > 12) return dayOfParts(label, last, second, first);
  if (Number(second) > 12 || first === second) return dayOfParts(label, last, first, second);
  const example = `${last}-${second.padStart(2, '0')}-${first.padStart(2, '0')}`;
  return { ok: false, message: `${label}: day and month can be mistaken: write it as ${example}` };
}

function dayOfParts(label: string, year: string, month: string, date: string): Reading<string> {
  const value = `${year}-${month.padStart(2, '0')}-${date.padStart(2, '0')}`;
  return isDay(value) ? { ok: true, value } : { ok: false, message: `${label}: there is no such day` };
}
