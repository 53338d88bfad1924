import { describe, expect, it } from 'vitest';
import { rankedItem, rankingOf } from '../../test/rankings';
import { exampleRanking } from '../../test/exampleRanking';
import { barOf, barScale, BAR_WIDTH } from './barScale';
import { gridColumns } from './gridColumns';
import { gridRows } from './gridRows';
import { inUnit } from './noiseUnit';

const { request } = exampleRanking();
const items = [
  rankedItem(request, 1, 'VR-1108'),
  rankedItem(request, 2, 'VR-1109'),
  rankedItem(request, 3, 'LQ-12', { voltageNoise: 90e-9, currentNoise: null }),
].map((item) => ({ ...item, quietSet: item.rank < 3 }));

describe('the ranking’s rows', () => {
  const { unit, floor, rows } = gridRows(rankingOf(request, items), items, request);

  it('state all noise in the unit of the floor, which the heading carries', () => {
    expect(unit).toBe('nV');
    expect(gridColumns(unit, null).map(({ headerName }) => headerName)).toContain('noise, nV rms');
    expect(floor.noise.text).toBe('574');
    expect(Number(rows[2].noise.text.replace(/\s/g, ''))).toBeGreaterThan(10_000);
  });

  it('keep three digits and round none away before the mark', () => {
    expect([6.76e-8, 1.02e-7, 4.336e-6, 9.9999e-8, 0].map((value) => inUnit(value, 'nV'))).toEqual([
      '67.6',
      '102',
      '4336',
      '100',
      '0',
    ]);
  });

  it('say the library of parts whose number two libraries have', () => {
    const twin = { ...items[1], part: { ...items[1].part, id: '77', library: 'curated' as const } };
    const { rows: told } = gridRows(rankingOf(request, items), [...items, twin], request);
    expect(told.map(({ part }) => part.library)).toEqual([null, 'own', null, 'curated']);
  });

  it('state prices in the currency and for the quantity of the heading, only where there are any', () => {
    const unitPrice = { amount: '3.6', currency: 'EUR' } as NonNullable<(typeof items)[0]['unitPrice']>;
    const priced = [{ ...items[0], unitPrice }, items[1]];
    const grid = gridRows(rankingOf(request, priced), priced, { ...request, quantity: 250 });
    expect(grid.priceHeading).toBe('€ at 250');
    expect(grid.rows.map(({ price }) => price)).toEqual(['3.60', 'no price']);
    expect(gridColumns('nV', grid.priceHeading).at(-1)).toMatchObject({ headerName: '€ at 250' });
    expect(gridRows(rankingOf(request, items), items, request).priceHeading).toBeNull();
  });

  it('bracket the quiet set', () => {
    expect(rows.map(({ place }) => place.bracket)).toEqual(['first', 'last', null]);
  });

  it('name the floor by its resistance and temperature', () => {
    expect(floor.part.maker).toMatch(/^source floor, 1\u2009kΩ at 25\u2009°C$/);
    expect(floor.aboveFloor).toBe('0.00\u2009dB');
  });

  it('show the part’s own cautions, not those that every part has', () => {
    expect(rows[2].part.cautions).toEqual(['current-noise-unknown']);
    expect(items[0].cautions).toContain('feedback-network-loads-output');
    expect(rows[0].part.cautions).toEqual([]);
  });
});

describe('the budget bar', () => {
  const nothing = { ...items[0].contributions, source: 0, feedback: 0, bias: 0, excess: 0 };
  const powers = { ...nothing, amplifierVoltage: 0, amplifierCurrentSource: 0, amplifierCurrentFeedback: 0 };

  it('is as long as the noise power over the floor’s', () => {
    const scale = barScale(1, 1.2);
    const floor = barOf({ ...powers, source: 1 }, scale);
    const twice = barOf({ ...powers, source: 1, amplifierVoltage: 1 }, scale);
    expect(twice.pieces[1].width).toBeCloseTo(floor.pieces[0].width, 9);
    expect(twice.pieces[1].x).toBeCloseTo(floor.pieces[0].width, 9);
    expect(twice.overflows).toBe(false);
  });

  it('ends at its place and says so', () => {
    const { pieces, overflows } = barOf({ ...powers, source: 1, amplifierVoltage: 9 }, barScale(1, 1.2));
    expect(pieces.reduce((sum, { width }) => sum + width, 0)).toBeCloseTo(BAR_WIDTH, 9);
    expect(overflows).toBe(true);
  });

  it('leaves the quietest part half of its place, however far above the floor it is', () => {
    const quietest = barOf({ ...powers, source: 1, amplifierVoltage: 30 }, barScale(1, Math.hypot(1, 30)));
    expect(quietest.pieces.reduce((sum, { width }) => sum + width, 0)).toBeCloseTo(BAR_WIDTH / 2, 9);
    expect(barScale(0, 2)).toBeGreaterThan(0);
  });
});
