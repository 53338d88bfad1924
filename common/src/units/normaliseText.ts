const INVISIBLE = /[\u00AD\u200B-\u200F\u202A-\u202E\u2060\uFEFF]/g;
const SUPERSCRIPTS = /[\u00B2\u00B3\u00B9\u2070\u2074-\u207B]+/g;
const DEGREES = /[\u00BA\u02DA]/g;
const DASHES = /[\u2010-\u2015\u2212]/g;
const TIMES_TEN = /\s*[×·⋅*]\s*10\^([+-]?\d+)/;

/**
 * Typed or pasted text in one spelling: NFKC (full-width forms, both ohm signs, all kinds of space), one micro sign,
 * ASCII hyphen for every minus and dash, no invisible characters, `×10⁻⁹` as `e-9`.
 * Superscripts are marked with `^` first, since NFKC would make 103 of 10³.
 */
export function normaliseText(text: string): string {
  return text
    .replace(INVISIBLE, '')
    .replace(SUPERSCRIPTS, (run) => `^${run}`)
    .replace(DEGREES, '°')
    .normalize('NFKC')
    .replace(/\u03BC/g, 'µ')
    .replace(DASHES, '-')
    .replace(/\s+/g, ' ')
    .replace(TIMES_TEN, 'e$1')
    .trim();
}
