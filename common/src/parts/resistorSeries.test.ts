import { describe, expect, it } from 'vitest';
import { readResistorSeries, resistorsOfSeries } from './resistorSeries.js';

const row = {
  manufacturer: 'Vireo',
  'part number': 'VR-T',
  package: '0603',
  technology: 'thin film',
  'preferred values': 'E3',
  'resistance [Ω]': '10',
  'highest resistance [Ω]': '1000',
  'tolerance [%]': '0.1',
  'noise index [dB]': '-36',
  'highest noise index [dB]': '-30',
};

function parts(change: Record<string, string> = {}) {
  const reading = readResistorSeries({ ...row, ...change });
  if (!reading.ok) throw new Error(JSON.stringify(reading.errors));
  return resistorsOfSeries(reading.series);
}

describe('a series of resistors', () => {
  it('has a part at each preferred value, its noise index rising with the logarithm of the value', () => {
    expect(
      parts().map(({ partNumber, resistor }) => [partNumber, resistor.resistance, resistor.noiseIndex]),
    ).toEqual([
      ['VR-T-10R0', 10, -36],
      ['VR-T-22R0', 22, -35],
      ['VR-T-47R0', 47, -34],
      ['VR-T-100R', 100, -33],
      ['VR-T-220R', 220, -32],
      ['VR-T-470R', 470, -31],
      ['VR-T-1K00', 1000, -30],
    ]);
  });

  it('has a noise index of 0 dB, not −0 dB, where it passes through zero', () => {
    const [first] = parts({ 'noise index [dB]': '-0.01', 'highest noise index [dB]': '1' });
    expect(first.resistor.noiseIndex).toBe(0);
  });

  it('shares all else', () => {
    const [first, ...rest] = parts();
    expect(first).toMatchObject({ manufacturer: 'Vireo', package: '0603', lifecycle: 'active' });
    expect(first.resistor).toMatchObject({ technology: 'thin-film', tolerance: 0.001, powerRating: null });
    for (const part of rest) {
      const { partNumber, resistor } = first;
      const { resistance, noiseIndex } = part.resistor;
      expect({ ...part, partNumber, resistor: { ...part.resistor, ...only(resistor) } }).toEqual(first);
      expect([resistance, noiseIndex]).not.toEqual([resistor.resistance, resistor.noiseIndex]);
    }
  });

  it('may be of one value, and of an unknown noise index', () => {
    expect(parts({ 'highest resistance [Ω]': '10', 'highest noise index [dB]': '-36' })).toHaveLength(1);
    const unknown = parts({ 'highest noise index [dB]': '' });
    expect(new Set(unknown.map(({ resistor }) => resistor.noiseIndex))).toEqual(new Set([null]));
  });

  it.each([
    [{ 'preferred values': 'E7' }, 'preferred values'],
    [{ 'highest resistance [Ω]': '' }, 'resistor.resistance'],
    [{ 'tolerance [%]': '-1' }, 'resistor.tolerance'],
  ])('is refused at its field: %j', (change, field) => {
    expect(readResistorSeries({ ...row, ...change })).toMatchObject({ ok: false, errors: [{ field }] });
  });
});

function only({ resistance, noiseIndex }: { resistance: number; noiseIndex: number | null }) {
  return { resistance, noiseIndex };
}
