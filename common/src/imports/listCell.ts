import type { QuantityKind } from '../units/index.js';

/** How lists say that they don't know a value. */
const GAP =
  /^(?:[-–—?./*]+|n\.?\s?\/?\s?a\.?|n\.?\s?\/?\s?s\.?|k\.\s?a\.|n\.\s?c\.|none|null|unknown|tbd|unbekannt|inconnu)$/i;
const PEAKS = /(?<=\dV|[a-zµ]V)\s*\(?(?:p-?p|pk-?pk)\)?$/i;
const TYPICAL = /\s*\(?\btyp(?:ical|\.|isch)?\)?$/i;
const PLUS_MINUS = /^(?:±|\+\s*\/?\s*[-−–])\s*/;
const FRACTION = /^(\d+)\s*[/⁄]\s*(\d+)\s*(?:W|watts?)?$/i;
const SECOND_SPELLING = /,\s*\d+\/\d+\s*W$/i;

/** The letters that stand for a tolerance, in percent. Source: IEC 60062:2016. */
const TOLERANCE_CODES: Readonly<Record<string, string>> = {
  E: '0.005',
  L: '0.01',
  P: '0.02',
  W: '0.05',
  B: '0.1',
  C: '0.25',
  D: '0.5',
  F: '1',
  G: '2',
  H: '3',
  J: '5',
  K: '10',
  M: '20',
  N: '30',
};

/** Whether a cell of figures says in words or dashes that its value is unknown. */
export function isGapCell(cell: string): boolean {
  return GAP.test(cell.trim());
}

/**
 * A cell of figures as `parseQuantity` reads it: without the `±` of tolerances and temperature coefficients, `typ`
 * and the `pp` of peak-to-peak noise; `1/4W` as 0.25 W, the tolerance `F` as 1 %, `25 ppm` as ppm/K where a
 * temperature coefficient is meant, and `4,7kO` of lists without `Ω` as ohms. Any other cell stays as it is.
 */
export function figureOfCell(cell: string, kind: QuantityKind): string {
  const text = cell.trim().replace(TYPICAL, '');
  if (kind === 'fraction') return ofTolerance(text.replace(PLUS_MINUS, ''));
  if (kind === 'temperatureCoefficient')
    return text.replace(PLUS_MINUS, '').replace(/(?<=\d\s*)ppm$/i, 'ppm/K');
  if (kind === 'power') return ofPower(text.replace(SECOND_SPELLING, ''));
  if (kind === 'voltage') return text.replace(PEAKS, '');
  return kind === 'resistance' ? text.replace(/(?<=\d\s*[kMGm]?)O$/, 'Ω') : text;
}

function ofTolerance(text: string): string {
  const percent = TOLERANCE_CODES[text.toUpperCase()];
  return percent === undefined ? text : `${percent} %`;
}

function ofPower(text: string): string {
  const [, part, whole] = FRACTION.exec(text) ?? [];
  return part === undefined || Number(whole) === 0 ? text : `${Number(part) / Number(whole)} W`;
}
