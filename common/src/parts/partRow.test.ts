import { describe, expect, it } from 'vitest';
import { OP_AMP_CATALOGUE } from './opAmpCatalogue.js';
import { readPartRow } from './partRow.js';
import { RESISTOR_CATALOGUE } from './resistorCatalogue.js';

const opAmp = {
  manufacturer: 'Vireo ',
  'part number': 'VR-1',
  'voltage noise [nV/√Hz]': '1,1',
  'current noise [pA/√Hz]': '',
  'GBW (MHz)': '0.5 GHz',
  'voltage noise origin': 'measured',
  'current noise origin': 'maximum',
  shelf: 'B4',
};

const resistor = {
  Hersteller: 'Vireo',
  Bestellnummer: 'VR-2',
  Bauart: 'Thin Film',
  'Widerstand [kΩ]': '4,7',
  'Toleranz [%]': '0,1',
  TK: '25 ppm/°C',
  'Belastbarkeit [mW]': '125',
  'Rauschindex [dB]': '−32',
  'noise index origin': 'measured',
};

describe('readPartRow', () => {
  it('reads figures into SI units and takes what is missing for unknown or default', () => {
    expect(readPartRow(OP_AMP_CATALOGUE, opAmp)).toMatchObject({
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

  it('reads a resistor from German headings', () => {
    expect(readPartRow(RESISTOR_CATALOGUE, resistor)).toEqual({
      ok: true,
      part: {
        manufacturer: 'Vireo',
        partNumber: 'VR-2',
        description: '',
        package: '',
        lifecycle: 'active',
        approval: 'approved',
        resistor: {
          technology: 'thin-film',
          resistance: 4700,
          tolerance: 0.001,
          temperatureCoefficient: 2.5e-5,
          powerRating: 0.125,
          noiseIndex: -32,
          temperatureRise: null,
        },
        origins: { noiseIndex: 'measured' },
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
  ])('refuses %j of an op-amp at the field', (change, field, message) => {
    expect(readPartRow(OP_AMP_CATALOGUE, { ...opAmp, ...change })).toMatchObject({
      ok: false,
      errors: [{ field, message: message instanceof RegExp ? expect.stringMatching(message) : message }],
    });
  });

  it.each([
    [{ 'Widerstand [kΩ]': '0' }, 'resistor.resistance', /^resistance: a value from 1\snΩ to 10\sTΩ /],
    [{ 'Widerstand [kΩ]': '' }, 'resistor.resistance', /a value is needed/],
    [{ Bauart: 'cloth' }, 'resistor.technology', /one of metal-foil/],
    [{ TK: '25 ppm' }, 'resistor.temperatureCoefficient', /“25 ppm” is a fraction/],
    [{ 'Toleranz [%]': '101' }, 'resistor.tolerance', /^tolerance: a value from 0/],
  ])('refuses %j of a resistor at the field', (change, field, message) => {
    expect(readPartRow(RESISTOR_CATALOGUE, { ...resistor, ...change })).toMatchObject({
      ok: false,
      errors: [{ field, message: expect.stringMatching(message) }],
    });
  });
});
