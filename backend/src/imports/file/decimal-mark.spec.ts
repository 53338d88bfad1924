import { decimalMarkOf } from './decimal-mark.js';

describe('the decimal mark of a list', () => {
  it.each([
    [['1,15', '2,1'], 'semicolon', 'comma'],
    [['1.15', '1,000'], 'comma', 'point'],
    [['1.000', '4.700', '10.000,5'], 'semicolon', 'comma'],
    [['1,000', '4,700', '47,000'], 'comma', 'point'],
    [['1,000', '4,700'], 'semicolon', 'comma'],
    [['10,000,000', '1,000'], 'semicolon', 'point'],
    [['1.000.000', '4.700'], 'tab', 'comma'],
    [['0,125', '1.000'], 'tab', 'comma'],
    [['1.234', '1.5'], 'semicolon', 'point'],
    [['1.234', '2.345'], 'semicolon', 'point'],
    [['1,234'], 'tab', 'comma'],
    [['4,7 kΩ', 'R-1,000-A'], 'semicolon', 'comma'],
    [['SOIC-8', '', '1200'], 'tab', 'point'],
  ] as const)('%j, parted by a %s, is a %s', (cells, delimiter, mark) => {
    expect(decimalMarkOf(cells, delimiter)).toBe(mark);
  });
});
