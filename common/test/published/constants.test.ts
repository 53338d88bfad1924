import { boltzmann, elementaryCharge, erf, planckConstant } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { BOLTZMANN, ELEMENTARY_CHARGE, PEAK_TO_PEAK_OVER_RMS, PLANCK } from '../../src/noise/index.js';

describe('the constants', () => {
  // CODATA values as the package mathjs holds them.
  it.each([
    ['Boltzmann constant', BOLTZMANN, boltzmann.toNumber('J/K')],
    ['Planck constant', PLANCK, planckConstant.toNumber('J s')],
    ['elementary charge', ELEMENTARY_CHARGE, elementaryCharge.toNumber('C')],
  ])('hold the CODATA value of the %s', (_name, own, codata) => {
    expect(own / codata).toBeCloseTo(1, 12);
  });

  // Common practice, no source: Gaussian noise leaves ±3.3 σ 0.1 % of the time.
  it('give a peak-to-peak value that is exceeded 0.1 % of the time', () => {
    const exceeded = 1 - erf(PEAK_TO_PEAK_OVER_RMS / 2 / Math.SQRT2);
    expect(exceeded).toBeGreaterThan(0.00095);
    expect(exceeded).toBeLessThan(0.00105);
  });
});
