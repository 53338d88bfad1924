import iconv from 'iconv-lite';
import { type Delimiter, DELIMITER_CHARACTERS, type Encoding } from './csv-format.js';

/** A list that is sent as a file, piece by piece. */
export interface WrittenList {
  name: string;
  pieces: AsyncIterable<Buffer>;
}

const SPELT: Readonly<Record<string, string>> = {
  '√': 'sqrt',
  Ω: 'Ohm',
  '−': '-',
  '\u2009': ' ',
  Δ: 'delta ',
};

/** A line of a list. */
export function csvLine(cells: readonly string[], delimiter: Delimiter): string {
  const character = DELIMITER_CHARACTERS[delimiter];
  return `${cells.map((cell) => quoted(cell, character)).join(character)}\r\n`;
}

function quoted(cell: string, delimiter: string): string {
  const needsQuotes = cell.includes(delimiter) || /["\r\n]|^\s|\s$/.test(cell);
  return needsQuotes ? `"${cell.replaceAll('"', '""')}"` : cell;
}

/** Turns text into the bytes of a list's encoding, with its byte order mark before the first. */
export function encoderOf({ encoding, byteOrderMark }: { encoding: Encoding; byteOrderMark: boolean }) {
  return {
    first: (text: string) => iconv.encode(text, encoding, { addBOM: byteOrderMark }),
    next: (text: string) => iconv.encode(text, encoding, { addBOM: false }),
  };
}

/** A text of our own, with words for the signs that an old encoding lacks. */
export function inEncoding(text: string, encoding: Encoding): string {
  if (encoding !== 'windows-1252') return text;
  return text.replace(/[√Ω−\u2009Δ]/g, (sign) => SPELT[sign]);
}
