import { describe, expect, it } from 'vitest';
import { frontierPath, nearestPoint, priceGeometry, PRICE_WIDTH } from './priceGeometry';
import { pricePlot, pricePlotCsv } from './pricePlot';

const part = (id: string, noise: number, amount: string | null) => ({
  id,
  name: `P-${id}`,
  partNumber: `P-${id}`,
  noise,
  unitPrice: amount === null ? null : { amount, currency: 'EUR' },
});
const quiet = part('1', 60e-9, '8.0000');
const between = part('2', 70e-9, '9.0000');
const cheap = part('9', 300e-9, '0.5000');
const frame = { quantity: 100, kind: 'voltage', floor: 50e-9 } as const;
const plot = pricePlot([quiet, between, part('3', 80e-9, null)], [quiet, cheap], frame);

describe('noise against price', () => {
  it('holds what is loaded and the whole frontier, in the order of price', () => {
    expect(plot.points.map(({ name, price, isOnFrontier }) => [name, price, isOnFrontier])).toEqual([
      ['P-9', 0.5, true],
      ['P-1', 8, true],
      ['P-2', 9, false],
    ]);
    expect(plot.unpriced.map(({ name }) => name)).toEqual(['P-3']);
    expect(plot.currency).toBe('EUR');
  });

  it('is saved as CSV, parts without a price last', () => {
    expect(pricePlotCsv(plot).split('\r\n')).toEqual([
      'part,price at 100 (EUR),input noise rms (V),on the frontier',
      'P-9,0.5,3e-7,yes',
      'P-1,8,6e-8,yes',
      'P-2,9,7e-8,no',
      'P-3,no price,,',
      '',
    ]);
  });

  it('draws the frontier as steps from the cheapest to the dearest', () => {
    const geometry = priceGeometry(plot);
    const path = frontierPath(plot.points, geometry);
    const [x, y] = [geometry.xOf(8).toFixed(1), geometry.yOf(60e-9).toFixed(1)];
    expect(path).toContain(`H${x}V${y}H`);
    expect(path.match(/V/g)).toHaveLength(1);
  });

  it.each([
    ['a part alone', [part('1', 60e-9, '8.0000')]],
    ['parts of one price', [part('1', 60e-9, '8.0000'), part('2', 61e-9, '8.0000')]],
    ['a part that costs nothing', [part('1', 60e-9, '0.0000'), part('2', 50e-9, '3.0000')]],
  ])('keeps %s in sight, with values at both axes', (_, parts) => {
    const one = pricePlot(parts, [parts[0]], frame);
    const geometry = priceGeometry(one);
    expect(geometry.priceTicks.length).toBeGreaterThan(1);
    expect(geometry.noiseTicks.length).toBeGreaterThan(1);
    for (const { price, noise } of one.points) {
      expect(geometry.xOf(price)).toBeGreaterThanOrEqual(geometry.left);
      expect(geometry.xOf(price)).toBeLessThan(PRICE_WIDTH);
      expect(geometry.yOf(noise)).toBeGreaterThan(geometry.top);
    }
  });

  it('finds the part nearest to the pointer', () => {
    const geometry = priceGeometry(plot);
    const { points } = plot;
    expect(nearestPoint(points, geometry, geometry.xOf(0.6), geometry.yOf(280e-9))?.name).toBe('P-9');
    expect(nearestPoint([], geometry, 0, 0)).toBeUndefined();
  });
});
