export const DECIMAL_MARKS = ['point', 'comma'] as const;
export type DecimalMark = (typeof DECIMAL_MARKS)[number];

const GROUPED: Record<DecimalMark, RegExp> = {
  point: /(?<![\d.,])[1-9]\d{0,2}(?:,\d{3})+(?![\d,])/g,
  comma: /(?<![\d.,])[1-9]\d{0,2}(?:\.\d{3})+(?![\d.])/g,
};

/**
 * A cell without the marks that group thousands in its list: 1.234 is 1234 where the comma is the decimal
 * mark, and 1.5 stays. `parseQuantity` takes any one mark for the decimal one.
 */
export function ungrouped(cell: string, mark: DecimalMark): string {
  if (!cell.includes(mark === 'point' ? ',' : '.')) return cell;
  return cell.replace(GROUPED[mark], (number) => number.replace(/[.,]/g, ''));
}
