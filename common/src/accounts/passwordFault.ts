/** Characters that a new password has at least. */
export const PASSWORD_LEAST = 12;

/** Bytes of UTF-8 that a password has at most: what is longer would not count. */
const PASSWORD_MOST_BYTES = 72;

/**
 * What is wrong with the length of a new password, as a sentence; null = nothing. Characters are counted as a reader
 * counts them, an emoji as one; the upper limit is one of bytes, because that is how passwords are compared.
 *
 * @example passwordLengthFault('too short') // 'At least 12 characters are needed.'
 */
export function passwordLengthFault(password: string): string | null {
  if ([...password].length < PASSWORD_LEAST) return `At least ${PASSWORD_LEAST} characters are needed.`;
  if (utf8Length(password) > PASSWORD_MOST_BYTES)
    return `At most ${PASSWORD_MOST_BYTES} bytes can be kept: that is ${PASSWORD_MOST_BYTES} plain letters, fewer with accents.`;
  return null;
}

function utf8Length(text: string): number {
  return [...text].reduce((bytes, character) => bytes + bytesOf(character.codePointAt(0) ?? 0), 0);
}

function bytesOf(code: number): number {
  if (code < 0x80) return 1;
  if (code < 0x800) return 2;
  return code < 0x10000 ? 3 : 4;
}
