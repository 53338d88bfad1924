/**
 * A number whose digits stand in groups, or that has a decimal comma, written plainly: `1.234,56` read with the comma as
 * decimal mark is `1234.56`, `1,234` with the full stop is `1234`. Groups are parted by the other mark, spaces or
 * apostrophes, and have three digits.
 *
 * @param mark the decimal mark to read it with: `1,234` can be read with either
 * @returns null where it is no such number
 */
export function plainNumber(text: string, mark: '.' | ','): string | null {
  const group = mark === ',' ? "[.\\s’']" : "[,\\s’']";
  const number = new RegExp(`^(\\d{1,3}(?:${group}\\d{3})+|\\d+)(?:\\${mark}(\\d+))?$`);
  const [, whole, fraction] = number.exec(text.trim()) ?? [];
  if (whole === undefined) return null;
  const digits = whole.replace(/\D/g, '');
  return fraction === undefined ? digits : `${digits}.${fraction}`;
}

/** Everything that {@link plainNumber} can read in a text, with either decimal mark. */
export function plainNumbers(text: string): string[] {
  const readings = ([',', '.'] as const).flatMap((mark) => plainNumber(text, mark) ?? []);
  return [...new Set(readings)];
}
