import { describe, expect, it } from 'vitest';
import { OP_AMP_CATALOGUE, RESISTOR_CATALOGUE } from '../parts/index.js';
import { columnProposer } from './proposeColumn.js';

const opAmp = columnProposer(OP_AMP_CATALOGUE);
const resistor = columnProposer(RESISTOR_CATALOGUE);

describe('columnProposer', () => {
  it.each([
    ['en [nV/√Hz] @1kHz', { field: 'voltageNoise', form: 'spot', unit: 'nV/√Hz', frequency: 1000 }],
    ['en @10Hz (nV/rtHz)', { field: 'voltageNoise', form: 'spot', unit: 'nV/rtHz', frequency: 10 }],
    ['en 1 kHz', { field: 'voltageNoise', form: 'spot', unit: 'nV/√Hz', frequency: 1000, unitAssumed: true }],
    ['in at 10 Hz', { field: 'currentNoise', form: 'spot', frequency: 10 }],
    ['GBW (MHz)', { field: 'gainBandwidth', form: 'value', unit: 'MHz', unitAssumed: false }],
    ['GBW/kHz', { field: 'gainBandwidth', form: 'value', unit: 'kHz' }],
    ['GBW in MHz', { field: 'gainBandwidth', unit: 'MHz' }],
    ['en_nV/√Hz', { field: 'voltageNoise', form: 'value', unit: 'nV/√Hz' }],
    ['in typ', { field: 'currentNoise', form: 'value', unit: 'pA/√Hz', unitAssumed: true, origin: null }],
    ['en max [nV/√Hz]', { field: 'voltageNoise', form: 'value', origin: 'maximum' }],
    ['en p-p 0.1-10Hz [µV]', { field: 'voltageNoise', form: 'peak-to-peak', unit: 'µV' }],
    ['0.1 Hz to 10 Hz noise (nVpp)', { field: 'voltageNoise', form: 'peak-to-peak', unit: 'nV' }],
    ['vs max', { field: 'supplyMaximum', form: 'value', unit: 'V', origin: null }],
    ['Versorgung min [V]', { field: 'supplyMinimum', form: 'value', unit: 'V' }],
    ['Hersteller', { field: 'manufacturer', form: 'value', unit: null }],
    ['boîtier', { field: 'package', form: 'value' }],
    ['voltage noise origin', { field: 'voltageNoise', form: 'origin', unit: null }],
    ['GBW [V]', { field: 'gainBandwidth', unit: 'MHz', unitAssumed: true }],
    ['EN_NV_RTHZ_1KHZ', { field: 'voltageNoise', form: 'spot', unit: 'nV/√Hz', frequency: 1000 }],
    ['IN_PA_RTHZ', { field: 'currentNoise', unit: 'pA/√Hz' }],
    ['IQ_MA', { field: 'supplyCurrent', unit: 'mA' }],
    ['CIN (PF)', { field: 'inputCapacitance', unit: 'pF' }],
    ['CIN_PF', { field: 'inputCapacitance', unit: 'pF' }],
    ['GBW_MHZ', { field: 'gainBandwidth', unit: 'MHz' }],
    ['VS_MAX_V', { field: 'supplyMaximum', unit: 'V', origin: null }],
    ['Input Bias Current (Max) (nA)', { field: 'inputBiasCurrent', unit: 'nA', origin: 'maximum' }],
    ['Ib @ 25 °C [pA]', { field: 'inputBiasCurrent', unit: 'pA' }],
    ['Versorgungsspannung max. [V]', { field: 'supplyMaximum', unit: 'V', origin: null }],
    ["Tension d'alimentation min (V)", { field: 'supplyMinimum', unit: 'V' }],
    ['Spannungsrauschdichte (f = 1 kHz) / nV/√Hz', { field: 'voltageNoise', form: 'spot', frequency: 1000 }],
    ['Densité de bruit en tension (nV/vHz)', { field: 'voltageNoise', unit: 'nV/√Hz', unitAssumed: false }],
    ['Eingangsruhestrom in nA', { field: 'inputBiasCurrent', unit: 'nA' }],
    ['Manufacturer Part Number', { field: 'partNumber' }],
    ['MFR_NAME', { field: 'manufacturer' }],
    ['MFR_PN', { field: 'partNumber' }],
    ['Hersteller-Teilenummer', { field: 'partNumber' }],
    ['Package / Case', { field: 'package' }],
    ['Part Status', { field: 'lifecycle' }],
    ['Étage d’entrée', { field: 'inputType' }],
  ])('knows the column %s of op-amps', (heading, expected) => {
    expect(opAmp(heading)).toMatchObject(expected);
  });

  it.each([
    ['Widerstand [kΩ]', { field: 'resistance', unit: 'kΩ' }],
    ['Toleranz %', { field: 'tolerance', unit: '%' }],
    ['TCR ppm/°C', { field: 'temperatureCoefficient', unit: 'ppm/°C' }],
    ['Stromrauschen', { field: 'noiseIndex', unit: 'dB' }],
    ['Nennleistung in mW', { field: 'powerRating', unit: 'mW' }],
    ['Puissance nominale (W)', { field: 'powerRating', unit: 'W' }],
    ['RESISTANCE_KOHM', { field: 'resistance', unit: 'kΩ' }],
    ['Tolérance (%)', { field: 'tolerance', unit: '%' }],
  ])('knows the column %s of resistors', (heading, expected) => {
    expect(resistor(heading)).toMatchObject(expected);
  });

  it.each(['Lagerort', '', '@', '[nV/√Hz]', '1 kHz', 'noise p-p at the moon'])('leaves %j out', (heading) => {
    expect(opAmp(heading)).toBeNull();
  });
});
