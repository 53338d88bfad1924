const DANGEROUS = /^'*[=+\-−@\t\r]/;
const PLAIN_NUMBER = /^[+\-−]?\d[\d.,]*$/;

/**
 * A cell that a spreadsheet can't take for a formula: a text that begins with `=`, `+`, `−`, `-`, `@`, a tab or a
 * carriage return gets an apostrophe before it. A plain signed number stands as it is.
 */
export function harmlessCell(text: string): string {
  return DANGEROUS.test(text) && !PLAIN_NUMBER.test(text) ? `'${text}` : text;
}

/** The cell as it was before {@link harmlessCell}. */
export function originalCell(cell: string): string {
  return cell.startsWith("'") && DANGEROUS.test(cell) ? cell.slice(1) : cell;
}
