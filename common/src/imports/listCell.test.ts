import { describe, expect, it } from 'vitest';
import { figureOfCell, isGapCell } from './listCell.js';

describe('a cell of figures as lists write it', () => {
  it.each([
    ['±0,1 %', 'fraction', '0,1 %'],
    ['+/-5%', 'fraction', '5%'],
    ['F', 'fraction', '1 %'],
    ['±25 ppm/K', 'temperatureCoefficient', '25 ppm/K'],
    ['200ppm', 'temperatureCoefficient', '200ppm/K'],
    ['1/4W', 'power', '0.25 W'],
    ['1/8', 'power', '0.125 W'],
    ['0.25W, 1/4W', 'power', '0.25W'],
    ['1/0', 'power', '1/0'],
    ['80 nVpp', 'voltage', '80 nV'],
    ['80 nV p-p', 'voltage', '80 nV'],
    ['4,7kO', 'resistance', '4,7kΩ'],
    ['100 O', 'resistance', '100 Ω'],
    ['1,1 typ.', 'voltageNoiseDensity', '1,1'],
    ['±18', 'voltage', '±18'],
    ['4k7', 'resistance', '4k7'],
  ] as const)('%j of a %s is read as %j', (cell, kind, expected) => {
    expect(figureOfCell(cell, kind)).toBe(expected);
  });

  it.each(['-', '–', '---', 'n/a', 'N.A.', 'n. a.', 'k.A.', '?', 'tbd', ' none '])('%j is a gap', (cell) => {
    expect(isGapCell(cell)).toBe(true);
  });

  it.each(['', '0', '-1', 'A', 'n', '1/4'])('%j is no gap', (cell) => {
    expect(isGapCell(cell)).toBe(false);
  });
});
