import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { QuantityKind } from './kinds.js';
import { parseQuantity } from './parseQuantity.js';
import { QUANTITIES } from './quantities.js';

const KINDS = Object.keys(QUANTITIES) as QuantityKind[];

describe('parseQuantity refuses', () => {
  it.each<[string, QuantityKind, string]>([
    [
      '4x7',
      'resistance',
      '“4x7” is not a resistance: a number with a unit was expected, such as 4.7 kΩ or 4k7',
    ],
    [
      '50 ppm',
      'temperatureCoefficient',
      '“50 ppm” is a fraction; a temperature coefficient was expected, such as 50 ppm/K',
    ],
    ['5 V', 'resistance', '“5 V” is a voltage; a resistance was expected, such as 4.7 kΩ'],
    [
      '3.3 nV',
      'voltageNoiseDensity',
      '“3.3 nV” is a voltage; a voltage noise density was expected, such as 3.3 nV/√Hz',
    ],
    ['8..12', 'frequency', '“8..12” is not a frequency: one number was expected, this is a range'],
    ['8-12', 'resistance', '“8-12” is not a resistance: one number was expected, this is a range'],
    [
      '8 kΩ – 12 kΩ',
      'resistance',
      '“8 kΩ – 12 kΩ” is not a resistance: one number was expected, this is a range',
    ],
    ['8…12', 'gain', '“8…12” is not a gain: one number was expected, this is a range'],
    ['8 to 12', 'gain', '“8 to 12” is not a gain: one number was expected, this is a range'],
    ['', 'resistance', 'nothing was entered: a number with a unit was expected, such as 4.7 kΩ or 4k7'],
    [' \u2009 ', 'count', 'nothing was entered: a number was expected, such as 4'],
    ['1 mhz', 'frequency', '“1 mhz” may be millihertz or megahertz: write mHz or MHz'],
    [
      'warm',
      'temperature',
      '“warm” is not a temperature: a number with a unit was expected, such as 25 °C or 77 K (a number alone is in °C)',
    ],
  ])('“%s” as a %s, saying “%s”', (text, kind, message) =>
    expect(parseQuantity(text, kind)).toEqual({ ok: false, message }),
  );

  it.each(['1.2,3.4', '1,23,456', '10 00', '0.001,5', '1 234.567,8', '1..5,'])(
    'the contradicting marks of “%s”',
    (text) => expect(parseQuantity(text, 'resistance').ok).toBe(false),
  );

  it.each<[string, QuantityKind]>([
    ['10k', 'temperature'],
    ['10k', 'temperatureDifference'],
    ['9999 dB', 'gain'],
    ['×', 'gain'],
    ['10m', 'fraction'],
    ['10m', 'decibel'],
    ['4k7', 'temperature'],
    ['4k7k', 'resistance'],
    ['100 Pa', 'current'],
    ['10³ Ω', 'resistance'],
    ['3.3 nV/Hz', 'voltageNoiseDensity'],
    ['kΩ', 'resistance'],
    ['NaN', 'resistance'],
    ['Infinity', 'resistance'],
  ])('“%s” as a %s', (text, kind) => expect(parseQuantity(text, kind).ok).toBe(false));

  it.each(['1e400', '1e308 k', '1e-400', '1e99999999999999999999999', '-1e309', '1e-999 °C', '9e999 °F'])(
    '“%s”, which is beyond the range of numbers',
    (text) => {
      const kind = text.includes('°') ? 'temperature' : 'resistance';
      const parsed = parseQuantity(text, kind);
      expect(parsed).toMatchObject({ ok: false, message: expect.stringContaining('too large or too small') });
    },
  );

  it('endless text, quoting only its beginning', () => {
    const parsed = parseQuantity('9'.repeat(100_000), 'resistance');
    expect(!parsed.ok && parsed.message.length).toBeLessThan(200);
  });
});

describe('whatever is typed', () => {
  const fragment = fc.constantFrom(
    ...'0123456789.,-−–+ eEkKMmµunpRΩFHzV/√%°CdB()^~…ⅷ½³'.split(''),
    'Hz',
    '..',
    '\u2009',
  );
  const typed = fc.oneof(
    fc.string({ unit: 'binary' }),
    fc.array(fragment, { maxLength: 12 }).map((parts) => parts.join('')),
  );

  it('parseQuantity never throws and gives a finite number or a message', () => {
    fc.assert(
      fc.property(typed, fc.constantFrom(...KINDS), (text, kind) => {
        const parsed = parseQuantity(text, kind);
        if (parsed.ok) expect(Number.isFinite(parsed.value)).toBe(true);
        else expect(parsed.message).not.toBe('');
      }),
      { numRuns: 2000 },
    );
  });

  it.each(KINDS)('the example of a %s can be typed', (kind) =>
    expect(parseQuantity(QUANTITIES[kind].example, kind).ok).toBe(true),
  );
});
