/** The beginning of a text; half a character, which a cut may leave, is replaced. */
export function shortened(text: string, length: number): string {
  return wellFormed(text.slice(0, length));
}

/** A text without halves of characters, which no encoding can hold. */
export function wellFormed(text: string): string {
  return text.replace(/\p{Cs}/gu, '\uFFFD');
}
