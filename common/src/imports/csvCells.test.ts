import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { harmlessCell, harmlessUnknownCell, originalCell } from './csvCells.js';
import { ungrouped } from './decimalMark.js';

describe('harmlessCell', () => {
  it.each(['=1+1', '+cmd', '-cmd|x', '−A1', '@SUM(A1)', '\tx', '\rx', "'=1", '+3', '-41.5'])(
    'makes %j harmless and comes back as it was',
    (text) => {
      expect(harmlessCell(text)).toBe(`'${text}`);
      expect(originalCell(harmlessCell(text))).toBe(text);
    },
  );

  it.each(["'quoted'", 'plain', ''])('leaves %j alone', (text) => {
    expect(harmlessCell(text)).toBe(text);
    expect(originalCell(text)).toBe(text);
  });

  it('leaves a signed number alone where the cell may hold a figure', () => {
    expect(['-41.5', '−0,5', '+3', '-3+A1'].map(harmlessUnknownCell)).toEqual([
      '-41.5',
      '−0,5',
      '+3',
      "'-3+A1",
    ]);
  });

  it('gives every text back', () => {
    const text = fc.string({ unit: fc.constantFrom("'", '=', '-', '@', '1', ',', 'a', '\t', ' ') });
    fc.assert(fc.property(text, (original) => originalCell(harmlessCell(original)) === original));
  });
});

describe('ungrouped', () => {
  it.each([
    ['1.234', 'comma', '1234'],
    ['1.234.567,8', 'comma', '1234567,8'],
    ['1.5', 'comma', '1.5'],
    ['0.125', 'comma', '0.125'],
    ['1,234', 'point', '1234'],
    ['1,5', 'point', '1,5'],
    ['1,234.5 MHz', 'point', '1234.5 MHz'],
    ['12.3456', 'comma', '12.3456'],
    ['1.234', 'point', '1.234'],
  ] as const)('reads %s with decimal %s as %s', (cell, mark, expected) => {
    expect(ungrouped(cell, mark)).toBe(expected);
  });
});
