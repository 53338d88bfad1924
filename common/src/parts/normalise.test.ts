import { describe, expect, it } from 'vitest';
import { normalisePartKey, normaliseWord } from './normalise.js';

describe('normaliseWord', () => {
  it.each([
    ['Gehäuse', 'GEHAUSE'],
    ['gain–bandwidth product', 'Gain Bandwidth Product'],
    ['1/f corner', '1F-corner'],
    ['ｖｏｌｔａｇｅ noise', 'Voltage Noise'],
    ['Straße', 'STRASSE'],
  ])('takes %j and %j for the same word', (a, b) => {
    expect(normaliseWord(a)).toBe(normaliseWord(b));
  });

  it('gives the empty string for punctuation alone', () => {
    expect(normaliseWord(' –/… ')).toBe('');
  });
});

describe('normalisePartKey', () => {
  it.each([
    [
      ['ACME  corp.', 'AB-123'],
      ['Acme Corp', 'ab 123'],
    ],
    [
      ['Acme', 'AB123'],
      ['Acme Co., Ltd.', 'AB/123'],
    ],
    [
      ['Möller GmbH', 'X1'],
      ['MÖLLER', 'x1'],
    ],
    [
      ['Belmont S.A.', 'X1'],
      ['Belmont SA', 'X1'],
    ],
    [
      ['Ａｃｍｅ', 'Ｘ１'],
      ['Acme', 'X1'],
    ],
    [
      ['O’Hara AG', 'X1'],
      ['OHara', 'X1'],
    ],
  ])('takes %j and %j for the same part', (a, b) => {
    expect(normalisePartKey(a[0], a[1])).toBe(normalisePartKey(b[0], b[1]));
  });

  it.each([
    [
      ['Acme', 'AB123'],
      ['Acme', 'AB124'],
    ],
    [
      ['Möller', 'X1'],
      ['Moller', 'X1'],
    ],
    [
      ['Acme', 'B1'],
      ['AcmeB', '1'],
    ],
    [
      ['Co', 'X1'],
      ['Inc', 'X1'],
    ],
    [
      ['Acme', '+'],
      ['Acme', '-'],
    ],
  ])('keeps %j and %j apart', (a, b) => {
    expect(normalisePartKey(a[0], a[1])).not.toBe(normalisePartKey(b[0], b[1]));
  });
});
