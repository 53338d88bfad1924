import { describe, expect, it } from 'vitest';
import { readOpAmpRow } from './opAmpRow.js';

const row = {
  manufacturer: 'Vireo ',
  'part number': 'VR-1',
  'voltage noise [nV/√Hz]': '1,1',
  'current noise [pA/√Hz]': '',
  'GBW (MHz)': '0.5 GHz',
  'voltage noise origin': 'measured',
  'current noise origin': 'maximum',
  shelf: 'B4',
};

describe('readOpAmpRow', () => {
  it('reads figures into SI units and takes what is missing for unknown or default', () => {
    const reading = readOpAmpRow(row);
    expect(reading).toMatchObject({
      ok: true,
      part: {
        manufacturer: 'Vireo',
        partNumber: 'VR-1',
        lifecycle: 'active',
        approval: 'approved',
        amplifier: {
          inputType: null,
          channels: 1,
          voltageNoise: 1.1e-9,
          voltageNoiseCorner: 0,
          currentNoise: null,
          gainBandwidth: 5e8,
          inputBiasCurrent: null,
        },
        origins: { voltageNoise: 'measured' },
      },
    });
  });

  it.each([
    [{ 'voltage noise [nV/√Hz]': '' }, 'amplifier.voltageNoise', 'voltage noise: a value is needed'],
    [{ manufacturer: '' }, 'manufacturer', 'manufacturer: a text was expected'],
    [{ channels: '1.5' }, 'amplifier.channels', 'channels: a whole number was expected'],
    [{ status: 'new' }, 'lifecycle', /one of active/],
    [{ en: '3 nV/√Hz' }, 'amplifier.voltageNoise', 'two columns hold this value: keep one'],
    [{ 'GBW (MHz)': '10 kΩ' }, 'amplifier.gainBandwidth', /gain–bandwidth product: /],
    [{ 'vs min': '5', 'vs max': '3' }, 'amplifier.supplyMaximum', /not below the supply minimum/],
  ])('refuses %j at the field', (change, field, message) => {
    const reading = readOpAmpRow({ ...row, ...change });
    expect(reading).toMatchObject({
      ok: false,
      errors: [{ field, message: message instanceof RegExp ? expect.stringMatching(message) : message }],
    });
  });
});
