/** "1 part", "7 000 parts". */
export function countOf(number: number, noun: string): string {
  return `${grouped(number)} ${noun}${number === 1 ? '' : 's'}`;
}

export function grouped(number: number): string {
  return new Intl.NumberFormat('en-GB').format(number).replaceAll(',', '\u2009');
}
