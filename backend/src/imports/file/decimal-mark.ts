import type { DecimalMark } from '@roothertz/common/imports';
import type { Delimiter } from '../../shared/csv/csv-format.js';

const LONGEST_CELL = 40;
const NUMBER = /(?<![\d.,])\d[\d.,]*[.,]\d+(?![\d.,])/;
const GROUPS = /^\d{1,3}(?:[.,]\d{3})+$/;
const OTHER: Record<DecimalMark, DecimalMark> = { comma: 'point', point: 'comma' };

/**
 * The decimal mark of a list's cells. A mark that stands twice in a number groups thousands, and of two marks the last
 * one is decimal; what has other than three digits behind it is decimal as well. Where every number could be read
 * either way, the mark counts as decimal, but for a comma in a list whose cells are parted by commas.
 */
export function decimalMarkOf(cells: readonly string[], delimiter: Delimiter): DecimalMark {
  const sure = { comma: 0, point: 0 };
  const perhaps = { comma: 0, point: 0 };
  for (const cell of cells) {
    const number = cell.length < LONGEST_CELL ? NUMBER.exec(cell)?.[0] : undefined;
    if (number === undefined) continue;
    const mark = sureMark(number);
    if (mark === null) perhaps[lastMark(number)] += 1;
    else sure[mark] += 1;
  }
  if (sure.comma !== sure.point) return sure.comma > sure.point ? 'comma' : 'point';
  return perhaps.comma > perhaps.point && delimiter !== 'comma' ? 'comma' : 'point';
}

/** Null where the number may have one decimal mark, or one that groups thousands. */
function sureMark(number: string): DecimalMark | null {
  const marks = number.replace(/\d/g, '');
  const last = lastMark(number);
  if (new Set(marks).size === 2) return last;
  if (marks.length > 1) return OTHER[last];
  return GROUPS.test(number) && !number.startsWith('0') ? null : last;
}

function lastMark(number: string): DecimalMark {
  return number.lastIndexOf(',') > number.lastIndexOf('.') ? 'comma' : 'point';
}
