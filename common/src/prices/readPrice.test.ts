import { describe, expect, it } from 'vitest';
import { currencyError, isDay, offerStates, plainNumber, readPrice, readRate } from './index.js';

describe('readPrice', () => {
  it.each([
    ['1', '1.0000'],
    ['0.0012', '0.0012'],
    [' 1234.5 ', '1234.5000'],
    ['999999999.9999', '999999999.9999'],
  ])('reads %s', (input, value) => {
    expect(readPrice(input)).toEqual({ ok: true, value });
  });

  it('reads a decimal comma where the list has that', () => {
    expect(readPrice('1234,5', ',')).toEqual({ ok: true, value: '1234.5000' });
  });

  it.each([
    ['1.234,56', '.', /1234\.56/],
    ['1,234.56', '.', /1234\.56/],
    ['1,23', '.', /write it as 1\.23$/],
    ['1,234', '.', /write it as 1\.234 or 1234$/],
    ['1 234.56', '.', /write it as 1234\.56$/],
    ['1.234,56', ',', /1234,56/],
    ['1.23', ',', /write it as 1,23$/],
    ['1.', '.', /misread|such as/],
    ['EUR 1.20', '.', /one currency/],
    ['1.20 $', '.', /one currency/],
    ['0', '.', /above 0/],
    ['0.0000', '.', /above 0/],
    ['-3', '.', /above 0/],
    ['−3', '.', /above 0/],
    ['1.00001', '.', /4 decimals/],
    ['1234567890', '.', /9 digits/],
    ['', '.', /a number was expected/],
    ['1e3', '.', /such as 1234\.56/],
    ['cheap', '.', /such as 1234\.56/],
  ] as const)('refuses “%s” with the decimal mark “%s”', (input, mark, message) => {
    expect(readPrice(input, mark)).toEqual({ ok: false, message: expect.stringMatching(message) });
  });

  it('reads rates to eight decimals', () => {
    expect(readRate('0.00003512')).toEqual({ ok: true, value: '0.00003512' });
    expect(readRate('0.000000001').ok).toBe(false);
  });
});

describe('plainNumber', () => {
  it.each([
    ['8,95', '8.95', null],
    ['1.234,56', '1234.56', null],
    ['1,234.56', null, '1234.56'],
    ['1,234', '1.234', '1234'],
    ['1 234\u202f567,8', '1234567.8', null],
    ['1’234.5', null, '1234.5'],
    ['1,23,456', null, null],
    ['12.34.56', null, null],
    ['', null, null],
    ['-8,95', null, null],
  ])('reads “%s” with a decimal comma as %s, with a full stop as %s', (text, comma, stop) => {
    expect([plainNumber(text, ','), plainNumber(text, '.')]).toEqual([comma, stop]);
  });
});

describe('currencyError', () => {
  it('knows the codes of ISO 4217', () => {
    expect(['EUR', 'USD', 'JPY', 'CHF'].map(currencyError)).toEqual([null, null, null, null]);
    expect([currencyError('XXY'), currencyError(''), currencyError(978)]).not.toContain(null);
  });
});

describe('isDay', () => {
  it('takes days of the calendar and nothing else', () => {
    expect(['2028-02-29', '2026-12-31'].every(isDay)).toBe(true);
    expect(
      ['2026-02-29', '2026-13-01', '1999-12-31', '2200-01-01', '2026-1-1', 20261201, null].some(isDay),
    ).toBe(false);
  });
});

describe('offerStates', () => {
  const states = (confirmed: string, validUntil: string | null) =>
    offerStates({ confirmedAt: `${confirmed}T23:59:00.000Z`, validUntil }, 90, '2026-12-01');

  it('calls stale what was confirmed longer ago than the team allows', () => {
    expect(states('2026-09-02', null)).toEqual([]);
    expect(states('2026-09-01', null)).toEqual(['stale']);
  });

  it('tells what ends within thirty days from what has ended', () => {
    expect(states('2026-11-30', '2027-01-01')).toEqual([]);
    expect(states('2026-11-30', '2026-12-31')).toEqual(['expiring']);
    expect(states('2026-11-30', '2026-12-01')).toEqual(['expiring']);
    expect(states('2026-01-01', '2026-11-30')).toEqual(['stale', 'expired']);
  });
});
