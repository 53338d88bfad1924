const DANGEROUS = /^'*[=+\-−@\t\r]/;
const SIGNED_NUMBER = /^[+\-−]\d[\d.,]*$/;

/**
 * A text as a cell that a spreadsheet can't take for a formula or a number: where it begins with `=`, `+`, `−`, `-`,
 * `@`, a tab or a carriage return, an apostrophe stands before it.
 */
export function harmlessCell(text: string): string {
  return DANGEROUS.test(text) ? `'${text}` : text;
}

/** A cell of which nobody knows whether it holds a text or a figure: a signed number does no harm. */
export function harmlessUnknownCell(cell: string): string {
  return SIGNED_NUMBER.test(cell) ? cell : harmlessCell(cell);
}

/** The text as it was before {@link harmlessCell}. */
export function originalCell(cell: string): string {
  return cell.startsWith("'") && DANGEROUS.test(cell) ? cell.slice(1) : cell;
}
