import { describe, expect, it } from 'vitest';
import { gaussLegendre } from './gaussLegendre.js';

function integrate(order: number, f: (x: number) => number): number {
  const { nodes, weights } = gaussLegendre(order);
  return nodes.reduce((sum, x, k) => sum + weights[k] * f(x), 0);
}

describe('gaussLegendre', () => {
  it.each([1, 2, 3, 6, 16, 64, 100])(
    'of order %i is exact for powers up to twice the order, less one',
    (order) => {
      for (let power = 0; power <= 2 * order - 1; power++) {
        const exact = power % 2 === 0 ? 2 / (power + 1) : 0;
        expect(Math.abs(integrate(order, (x) => x ** power) - exact)).toBeLessThan(1e-13);
      }
    },
  );

  it.each([1, 2, 3, 6])('of order %i isn’t exact for the power of twice the order', (order) => {
    expect(Math.abs(integrate(order, (x) => x ** (2 * order)) - 2 / (2 * order + 1))).toBeGreaterThan(1e-5);
  });

  // Abramowitz & Stegun 1964, table 25.4, n = 3.
  it('has the tabulated nodes and weights of order 3', () => {
    const { nodes, weights } = gaussLegendre(3);
    expect(nodes[0]).toBeCloseTo(-0.774596669241483, 14);
    expect(nodes[1]).toBeCloseTo(0, 14);
    expect(weights[0]).toBeCloseTo(0.555555555555556, 14);
    expect(weights[1]).toBeCloseTo(0.888888888888889, 14);
  });

  it('gives its nodes in ascending order inside (−1, 1)', () => {
    const nodes = [...gaussLegendre(50).nodes];
    expect(nodes).toEqual([...nodes].sort((a, b) => a - b));
    expect(nodes[0]).toBeGreaterThan(-1);
    expect(nodes[49]).toBeLessThan(1);
  });
});
