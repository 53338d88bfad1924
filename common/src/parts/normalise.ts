const COMPANY_SUFFIXES = new Set([
  'corp',
  'corporation',
  'inc',
  'incorporated',
  'gmbh',
  'ltd',
  'limited',
  'co',
  'company',
  'ag',
  'sa',
]);

/**
 * A word or heading without case, accents, spaces and punctuation, so that "Gehäuse", "GEHAUSE" and
 * "ge-häuse" compare equal. Any text is allowed; a text of punctuation alone gives the empty string.
 */
export function normaliseWord(text: string): string {
  return foldCase(text)
    .normalize('NFKD')
    .replace(/[^\p{L}\p{N}]/gu, '');
}

/**
 * What makes a part the same part whatever way its name is written: manufacturer and part number in
 * Unicode form NFKC, without case, spaces and punctuation, and the manufacturer without the suffixes
 * of its company form, so that "ACME  corp." and "Acme Corp" agree. Accents count. A name of
 * punctuation alone stands as it is, so that the key never loses a name.
 */
export function normalisePartKey(manufacturer: string, partNumber: string): string {
  return `${normaliseMaker(manufacturer)}|${lettersAndDigits(partNumber)}`;
}

/** A maker's name without case, marks and the suffixes of its company form: "ACME  corp." → `acme`. */
export function normaliseMaker(manufacturer: string): string {
  const words = foldCase(manufacturer)
    .replace(/\./g, '')
    .split(/[^\p{L}\p{N}\p{M}]+/u)
    .filter((word) => word !== '');
  while (words.length > 1 && COMPANY_SUFFIXES.has(words.at(-1)!)) words.pop();
  return words.join('') || foldCase(manufacturer).trim();
}

/** A text's letters and digits without case; a text that has none stands as it is. */
export function lettersAndDigits(text: string): string {
  const folded = foldCase(text);
  return folded.replace(/[^\p{L}\p{N}\p{M}]/gu, '') || folded.trim();
}

function foldCase(text: string): string {
  return text.normalize('NFKC').toUpperCase().toLowerCase().normalize('NFKC');
}
