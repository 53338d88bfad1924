import { describe, expect, it } from 'vitest';
import type { QuantityKind } from './kinds.js';
import { parseRange } from './parseRange.js';

describe('parseRange', () => {
  it.each<[string, QuantityKind, number, number]>([
    ['0.1-10', 'frequency', 0.1, 10],
    ['0.1–10 Hz', 'frequency', 0.1, 10],
    ['0,1 … 10 Hz', 'frequency', 0.1, 10],
    ['20 Hz to 20 kHz', 'frequency', 20, 20e3],
    ['20-20k', 'frequency', 20, 20e3],
    ['20–20 kHz', 'frequency', 20, 20e3],
    ['1-100 kHz', 'frequency', 1e3, 100e3],
    ['1e-3-10', 'frequency', 1e-3, 10],
    ['1e-3 - 1e3 Hz', 'frequency', 1e-3, 1e3],
    ['5..15 V', 'voltage', 5, 15],
    ['-5 to 5 V', 'voltage', -5, 5],
    ['4k7-10k', 'resistance', 4700, 10e3],
  ])('reads “%s” as a range of %s', (text, kind, from, to) =>
    expect(parseRange(text, kind)).toEqual({ from, to }),
  );

  it.each<[string, QuantityKind]>([
    ['10', 'frequency'],
    ['1e-3', 'frequency'],
    ['-5 V', 'voltage'],
    ['10-1 Hz', 'frequency'],
    ['1-10 V', 'frequency'],
    ['1 V to 10 Hz', 'frequency'],
    ['5 to', 'voltage'],
    ['stove', 'frequency'],
    ['', 'frequency'],
  ])('finds none in “%s” as a %s', (text, kind) => expect(parseRange(text, kind)).toBeNull());
});
