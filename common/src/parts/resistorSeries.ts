import { type PartRow, type PartRowReading, readPartRow } from './partRow.js';
import { PREFERRED_SERIES, type PreferredSeries, preferredValuesBetween } from './preferredValues.js';
import type { ResistorPart } from './resistor.js';
import { RESISTOR_CATALOGUE } from './resistorCatalogue.js';
import { valueCode } from './valueCode.js';

/** A maker's series of resistors, which differ in value and in the noise index that follows from it. */
export interface ResistorSeries {
  /** Its part number is the beginning of all part numbers. */
  lowest: ResistorPart;
  highest: ResistorPart;
  preferred: PreferredSeries;
}

const ENDS = ['resistance [Ω]', 'noise index [dB]'];

/**
 * Reads a row of a list of series, heading → cell: the lowest part's row, with `highest resistance [Ω]`
 * and `highest noise index [dB]` of the other end and `preferred values` such as `E96`.
 */
export function readResistorSeries(
  row: PartRow,
): { ok: true; series: ResistorSeries } | Extract<PartRowReading<never>, { ok: false }> {
  const lowest = readPartRow(RESISTOR_CATALOGUE, row);
  const ends = ENDS.map((heading) => [heading, row[`highest ${heading}`]]);
  const highest = readPartRow(RESISTOR_CATALOGUE, { ...row, ...Object.fromEntries(ends) });
  if (!lowest.ok) return lowest;
  if (!highest.ok) return highest;
  const preferred = PREFERRED_SERIES.find((count) => `E${count}` === row['preferred values']);
  if (preferred !== undefined)
    return { ok: true, series: { lowest: lowest.part, highest: highest.part, preferred } };
  const message = `preferred values: one of ${PREFERRED_SERIES.map((count) => `E${count}`).join(', ')} was expected`;
  return { ok: false, errors: [{ field: 'preferred values', message }] };
}

/**
 * All parts of a series: one at each preferred value of its range, its part number the series' own with
 * the value's code. The noise index goes evenly with the logarithm of the value from end to end, in
 * steps of 0.1 dB (common practice, no source); it is unknown where an end's is.
 */
export function resistorsOfSeries(series: ResistorSeries): ResistorPart[] {
  const { lowest, highest, preferred } = series;
  const values = preferredValuesBetween(preferred, lowest.resistor.resistance, highest.resistor.resistance);
  return values.map((resistance) => ({
    ...lowest,
    partNumber: `${lowest.partNumber}-${valueCode(resistance)}`,
    resistor: { ...lowest.resistor, resistance, noiseIndex: noiseIndexAt(series, resistance) },
  }));
}

function noiseIndexAt({ lowest, highest }: ResistorSeries, resistance: number): number | null {
  const [from, to] = [lowest.resistor, highest.resistor];
  if (from.noiseIndex === null || to.noiseIndex === null) return null;
  const decades = Math.log(to.resistance / from.resistance);
  const place = decades > 0 ? Math.log(resistance / from.resistance) / decades : 0;
  // Rounding may give −0.
  return Math.round((from.noiseIndex + place * (to.noiseIndex - from.noiseIndex)) * 10) / 10 + 0;
}
