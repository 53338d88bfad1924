import { describe, expect, it } from 'vitest';
import { describeChange } from './describeChange.js';

describe('describeChange', () => {
  it('names what differs, with both values, and nothing else', () => {
    const from = { id: '7', currency: 'EUR', stock: 10, leadTimeDays: null };
    const to = { partId: '3', currency: 'EUR', stock: 0, leadTimeDays: 42 };
    expect(describeChange(from, to)).toEqual([
      { field: 'stock', from: '10', to: '0' },
      { field: 'lead time days', from: null, to: '42' },
    ]);
  });

  it('writes a moment as a reader would, and leaves other texts alone', () => {
    const to = {
      trialEndsAt: '2026-12-15T14:52:10.861Z',
      note: 'since 2026-12-15T14:52:10.861Z',
      day: '2026-12-15',
    };
    expect(describeChange(null, to).map((change) => change.to)).toEqual([
      '2026-12-15 14:52 UTC',
      'since 2026-12-15T14:52:10.861Z',
      '2026-12-15',
    ]);
  });

  it('tells of what is new or gone all that it holds', () => {
    expect(describeChange(null, { name: 'Brook', note: '' })).toEqual([
      { field: 'name', from: null, to: 'Brook' },
    ]);
    expect(describeChange({ roles: ['admin', 'engineer'] }, null)).toEqual([
      { field: 'roles', from: 'admin, engineer', to: null },
    ]);
    expect(describeChange(null, null)).toEqual([]);
  });

  it('looks into nested values', () => {
    const from = { name: 'Geophone', stage: { gain: 100, network: { minimumTotal: 500 } } };
    const to = { name: 'Geophone', stage: { gain: 10, network: {} } };
    expect(describeChange(from, to)).toEqual([
      { field: 'stage gain', from: '100', to: '10' },
      { field: 'stage network minimum total', from: '500 Ω', to: null },
    ]);
  });

  it('writes physical values with their units, and no two of them alike', () => {
    const from = {
      amplifier: { voltageNoise: 1.2345e-9 },
      band: { upper: 20_000 },
      ambientTemperature: 298.15,
    };
    const to = { amplifier: { voltageNoise: 1.2346e-9 }, band: { upper: 100 }, ambientTemperature: 233.15 };
    expect(describeChange(from, to)).toEqual([
      { field: 'amplifier voltage noise', from: '1.2345 nV/√Hz', to: '1.2346 nV/√Hz' },
      { field: 'band upper', from: '20 kHz', to: '100 Hz' },
      { field: 'ambient temperature', from: '25 °C', to: '−40 °C' },
    ]);
  });

  it('puts lists on one line', () => {
    const breaks = [
      { minimumQuantity: 1, unitPrice: '4.2000' },
      { minimumQuantity: 100, unitPrice: '3.1000' },
    ];
    expect(describeChange({ breaks: [] }, { breaks, open: true })).toEqual([
      {
        field: 'breaks',
        from: null,
        to: 'minimum quantity 1 unit price 4.2000, minimum quantity 100 unit price 3.1000',
      },
      { field: 'open', from: null, to: 'yes' },
    ]);
  });
});
