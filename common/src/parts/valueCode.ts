const LETTERS: readonly [number, string][] = [
  [1e9, 'G'],
  [1e6, 'M'],
  [1e3, 'K'],
  [1, 'R'],
];

/**
 * A resistance in four characters, three digits and a letter in place of the decimal mark: 4.7 kΩ is
 * `4K70`, 0.22 Ω `R220`.
 *
 * @param resistance Ω, 1 mΩ to 999 GΩ; digits after the third are rounded away
 * Source: IEC 60062:2016, whose codes may leave out zeros that end them.
 */
export function valueCode(resistance: number): string {
  const rounded = Number(resistance.toPrecision(3));
  if (rounded < 1)
    return `R${Math.round(rounded * 1000)
      .toString()
      .padStart(3, '0')}`;
  const [unit, letter] = LETTERS.find(([size]) => rounded >= size)!;
  const digits = (rounded / unit).toPrecision(3);
  return digits.includes('.') ? digits.replace('.', letter) : digits + letter;
}
