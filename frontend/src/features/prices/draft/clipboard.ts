/**
 * The cells of a rectangle as spreadsheets put it on the clipboard: rows by line, cells by tab, and a cell with either in
 * it in quotes.
 */
export function readClipboard(text: string): string[][] {
  const rows: string[][] = [[]];
  const cells = /("(?:[^"]|"")*"|[^\t\r\n]*)(\t|\r\n|\r|\n|$)/gy;
  for (let match = cells.exec(text); match !== null; match = cells.exec(text)) {
    const [whole, cell, end] = match;
    rows.at(-1)!.push(unquoted(cell));
    if (end === '' || whole === '') break;
    if (end !== '\t') rows.push([]);
  }
  const isBlank = (row: string[]) => row.length <= 1 && (row[0] ?? '') === '';
  while (rows.length > 1 && isBlank(rows.at(-1)!)) rows.pop();
  return rows;
}

function unquoted(cell: string): string {
  return /^".*"$/s.test(cell) ? cell.slice(1, -1).replaceAll('""', '"') : cell;
}
