/** The decimal digits of a number: d.ddd · 10^exponent, `digits` without sign and mark. */
export interface Scientific {
  negative: boolean;
  digits: string;
  exponent: number;
}

const MINUS = '\u2212';
const THIN_SPACE = '\u2009';

/** A finite number's digits, rounded to `digits` significant ones, or the shortest that give the number back. */
export function scientific(value: number, digits?: number): Scientific {
  const [mantissa, exponent] = Math.abs(value)
    .toExponential(digits === undefined ? undefined : digits - 1)
    .split('e');
  return { negative: value < 0, digits: mantissa.replace('.', ''), exponent: Number(exponent) };
}

/** The digits as a plain number, divided by 10^shift. */
export function writePlain({ negative, digits, exponent }: Scientific, shift = 0): string {
  const point = exponent - shift + 1;
  const padded = point > 0 ? digits.padEnd(point, '0') : '0'.repeat(1 - point) + digits;
  const at = Math.max(point, 1);
  return signed(negative, joined(padded.slice(0, at), padded.slice(at)));
}

/** The digits in exponent form, divided by 10^shift: `1.23e−30`. */
export function writeExponent({ negative, digits, exponent }: Scientific, shift = 0): string {
  const power = signed(exponent < shift, String(Math.abs(exponent - shift)));
  return `${signed(negative, joined(digits.slice(0, 1), digits.slice(1)))}e${power}`;
}

/** Drops the zeros that end a fraction, and the mark with them: `4.70` → `4.7`, `1.00e30` → `1e30`. */
export function trimZeros(text: string): string {
  return text.replace(/\.(\d*?)0+(?=e|$)/, (_all, kept: string) => (kept ? `.${kept}` : ''));
}

/** Puts thin spaces between groups of three before the mark, from five digits on. */
export function groupThousands(text: string): string {
  return text.replace(/\d{5,}/, (whole, at: number) =>
    text.slice(0, at).includes('.') ? whole : whole.replace(/\B(?=(?:\d{3})+$)/g, THIN_SPACE),
  );
}

/** A number with a fixed count of decimals and the true minus; zero has no sign. */
export function writeFixed(value: number, decimals: number): string {
  const text = Math.abs(value).toFixed(decimals);
  return signed(value < 0 && Number(text) !== 0, text);
}

function joined(whole: string, part: string): string {
  return part === '' ? whole : `${whole}.${part}`;
}

function signed(negative: boolean, text: string): string {
  return negative ? MINUS + text : text;
}
