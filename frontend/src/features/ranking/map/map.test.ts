import { describe, expect, it } from 'vitest';
import { EXAMPLE } from '../../../test/exampleRanking';
import { borderPath, decadesOn, mapGeometry } from './mapGeometry';
import { mapCsv } from './mapCsv';
import { mapRequest, movedTo } from './mapRequest';
import { cellText, mapShares } from './mapWords';
import { labelSpot, territoriesOf } from './territories';

const part = (id: string, partNumber: string) => ({
  id,
  partNumber,
  manufacturer: 'Vireo',
  library: 'curated' as const,
  package: 'SOIC-8',
  lifecycle: 'active' as const,
  approval: 'approved' as const,
});

/** Four resistances, each a column of three frequencies: A fills the left, B lies twice at the right. */
const MAP = {
  resistances: [1, 10, 100, 1000],
  frequencies: [10, 100, 1000],
  parts: [part('1', 'VR-1'), part('2', '=LQ,2')],
  winners: [
    [0, 0, 0],
    [0, 0, 0],
    [1, 0, 1],
    [1, 0, -1],
  ],
  libraryRevision: '1.1',
};
const plain = (text: string) => text.replaceAll('\u2009', ' ');

describe('territories', () => {
  it('are cells that adjoin, the largest first', () => {
    const territories = territoriesOf(MAP.winners);
    expect(territories.map(({ part: winner, cells }) => [winner, cells.length])).toEqual([
      [0, 8],
      [1, 2],
      [1, 1],
      [-1, 1],
    ]);
  });

  it('have their label where all of it lies inside, nearest to their middle', () => {
    const [largest, right] = territoriesOf(MAP.winners);
    expect(labelSpot(largest, 2, 3)).toEqual({ x: 1, y: 1.5 });
    expect(labelSpot(largest, 4, 1)).toEqual({ x: 2, y: 1.5 });
    expect(labelSpot(largest, 3, 2)).toBeNull();
    expect(labelSpot(right, 1.5, 0.8)).toEqual({ x: 3, y: 0.5 });
  });

  it('end where another part wins', () => {
    const geometry = mapGeometry(MAP);
    const lines = (path: string) => path.split('M').length - 1;
    expect(lines(borderPath(MAP.winners, geometry))).toBe(7);
    expect(lines(borderPath(MAP.winners, geometry, 1))).toBe(6);
    expect(lines(borderPath([[0, 0]], geometry))).toBe(0);
  });
});

describe('the map’s field', () => {
  it('has each value in the middle of its cells and holds what lies outside at its edge', () => {
    const geometry = mapGeometry(MAP);
    MAP.resistances.forEach((resistance, column) =>
      MAP.frequencies.forEach((frequency, row) =>
        expect(geometry.cellAt(geometry.xOf(resistance), geometry.yOf(frequency))).toEqual({ column, row }),
      ),
    );
    expect(geometry.cellAt(geometry.xOf(0), geometry.yOf(1e9))).toEqual({ column: 0, row: 2 });
    expect(geometry.cellAt(-5, 1e4)).toEqual({ column: 0, row: 0 });
  });

  it('is labelled at whole decades', () => {
    expect(decadesOn([0.1, 3, 1000])).toEqual([0.1, 1, 10, 100, 1000]);
    expect(decadesOn([2, 30])).toEqual([10]);
  });
});

describe('moving on the map', () => {
  it('changes source resistance and reference frequency, and leaves a band that holds it', () => {
    const { conditions } = movedTo(EXAMPLE, 3981.07, 1584.89);
    expect(conditions.source.resistance).toBe(4000);
    expect(conditions.referenceFrequency).toBe(1600);
    expect(conditions.band).toEqual(EXAMPLE.conditions.band);
  });

  it('lays the band with its ratio around a frequency outside of it', () => {
    const { band, referenceFrequency } = movedTo(EXAMPLE, 10, 1e6).conditions;
    expect(referenceFrequency).toBe(1e6);
    expect(band.upper / band.lower).toBeCloseTo(1000, -1);
    expect(Math.sqrt(band.upper * band.lower) / 1e6).toBeCloseTo(1, 2);
  });

  it('asks for no other map', () => {
    const ask = ({ conditions, filter }: typeof EXAMPLE) => JSON.stringify(mapRequest(conditions, filter));
    expect(ask(movedTo(EXAMPLE, 10, 1e6))).toBe(ask(EXAMPLE));
  });
});

describe('the map in words', () => {
  it('tells what is quietest in a cell', () => {
    expect(plain(cellText(MAP, { column: 3, row: 1 }))).toBe('1 kΩ, 100 Hz: VR-1 Vireo');
    expect(cellText(MAP, { column: 3, row: 2 })).toMatch(/no part is fast and stable enough$/);
  });

  it('tells how much of it each part has', () => {
    expect(mapShares(MAP)).toEqual([
      { index: 0, name: 'VR-1', share: 8 / 12 },
      { index: 1, name: '=LQ,2', share: 3 / 12 },
    ]);
  });

  it('is CSV with a row for each cell, in which no name is a formula', () => {
    const lines = mapCsv(MAP).split('\r\n');
    expect(lines[0]).toBe('source resistance (Ω),frequency (Hz),quietest part,manufacturer');
    expect(lines).toHaveLength(1 + 12 + 1);
    expect(lines[1]).toBe('1,10,VR-1,Vireo');
    expect(lines[7]).toBe(`100,10,"'=LQ,2",Vireo`);
    expect(lines[12]).toBe('1000,1000,,');
  });
});
