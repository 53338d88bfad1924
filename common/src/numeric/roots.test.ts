import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { polynomialRoots, type Complex } from './roots.js';

/** Ascending coefficients of the polynomial with these roots, the leading one 1; real for conjugate pairs. */
function fromRoots(roots: readonly Complex[]): number[] {
  let re = [1];
  let im = [0];
  for (const root of roots) {
    const next = (k: number, own: number[], other: number[], sign: number) =>
      (own[k - 1] ?? 0) - root.re * (own[k] ?? 0) + sign * root.im * (other[k] ?? 0);
    const degrees = [...re.keys(), re.length];
    [re, im] = [degrees.map((k) => next(k, re, im, 1)), degrees.map((k) => next(k, im, re, -1))];
  }
  return re;
}

const real = (re: number): Complex => ({ re, im: 0 });
const sorted = (roots: readonly Complex[]) => [...roots].sort((a, b) => a.re - b.re || a.im - b.im);

function expectRoots(found: readonly Complex[], expected: readonly Complex[], tolerance = 1e-8): void {
  expect(found).toHaveLength(expected.length);
  const left = [...found];
  for (const root of expected) {
    const distances = left.map(({ re, im }) => Math.hypot(re - root.re, im - root.im));
    const nearest = distances.indexOf(Math.min(...distances));
    expect(distances[nearest]).toBeLessThanOrEqual(tolerance * Math.hypot(root.re, root.im));
    left.splice(nearest, 1);
  }
}

describe('polynomialRoots', () => {
  it.each<[string, number[], Complex[]]>([
    ['a constant', [5], []],
    ['nothing but zeros', [0, 0, 0], []],
    ['a line', [6, 2], [real(-3)]],
    ['two real roots', [6, 5, 1], [real(-3), real(-2)]],
    ['a double root', [4, 4, 1], [real(-2), real(-2)]],
    ['a root at zero', [0, 3, 1], [real(-3), real(0)]],
    [
      'a conjugate pair',
      [5, 2, 1],
      [
        { re: -1, im: -2 },
        { re: -1, im: 2 },
      ],
    ],
    ['leading zeros', [6, 2, 0, 0], [real(-3)]],
  ])('solves %s', (_name, coefficients, roots) => {
    const found = sorted(polynomialRoots(coefficients));
    expect(found).toHaveLength(roots.length);
    roots.forEach(({ re, im }, k) => {
      expect(found[k].re).toBeCloseTo(re, 12);
      expect(found[k].im).toBeCloseTo(im, 12);
    });
  });

  it('keeps the small root of a quadratic whose roots are far apart', () => {
    expectRoots(polynomialRoots([1, 1e9, 1]), [real(-1e-9), real(-1e9)], 1e-12);
  });

  it('reconstructs a resonance of Q = 1e5 beside two real poles', () => {
    const roots = [{ re: -5e-6, im: 1 }, { re: -5e-6, im: -1 }, real(-30), real(-0.02)];
    expectRoots(polynomialRoots(fromRoots(roots)), roots);
  });

  it('finds well-separated roots of cubics and quartics over ten decades', () => {
    const magnitudes = fc
      .uniqueArray(fc.integer({ min: -5, max: 5 }), { minLength: 3, maxLength: 4 })
      .map((exponents) => exponents.map((exponent) => -1.7 * 10 ** exponent));
    fc.assert(
      fc.property(magnitudes, (values) => {
        const roots = values.map(real);
        expectRoots(polynomialRoots(fromRoots(roots)), roots, 1e-6);
      }),
      { seed: 1966, numRuns: 200 },
    );
  });
});
