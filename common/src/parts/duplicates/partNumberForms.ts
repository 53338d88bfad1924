import { lettersAndDigits } from '../normalise.js';

const REELS = 'T|R|TR|T&R|RL|REEL\\d*|R7|R13|CT|TAPE|TUBE|BULK|PBF|LF|NOPB';
const PACKAGES =
  'SOIC\\d*|SO\\d+|[STMV]*SOP\\d*|SOT\\d+|SC\\d+|[PC]?DIP\\d*|[QD]FN\\d*|TO\\d+|0201|0402|0603|0805|1206|1210|2010|2512';
const SUFFIX = new RegExp(`[-/#_., ](?:${REELS}|(?:${PACKAGES})(?:-\\d+)?)$`, 'i');
const LEAST_BASE = 3;

/** Letters that are taken for digits, on paper and by who copies from it. */
const MISREAD: Readonly<Record<string, string>> = { o: '0', i: '1', l: '1' };

/**
 * A part number as it looks: letters and digits alone, without case, the letters O, I and L as the digits
 * that they are taken for.
 */
export function lookOf(partNumber: string): string {
  return lettersAndDigits(partNumber).replace(/[oil]/g, (letter) => MISREAD[letter]);
}

/**
 * A part number without what it says of package and reel at its end, behind a mark: `LM-1/SOIC-8-TR` →
 * `LM-1`. At least three characters with a digit among them stay.
 */
export function baseNumber(partNumber: string): string {
  const base = partNumber.normalize('NFKC').trim().replace(SUFFIX, '');
  if (base === partNumber || base.length < LEAST_BASE || !/\d/.test(base)) return partNumber;
  return baseNumber(base);
}
