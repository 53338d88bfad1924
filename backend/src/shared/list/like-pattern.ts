/** The pattern of a text that stands anywhere, for `LIKE … ESCAPE '!'`. */
export function likePattern(text: string): string {
  return `%${text.replace(/[!%_]/g, '!$&')}%`;
}
