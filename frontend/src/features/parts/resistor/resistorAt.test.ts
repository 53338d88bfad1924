import { excessPowerDensity, thermalVoltageDensity } from '@roothertz/common/noise';
import { describe, expect, it } from 'vitest';
import { resistor } from '../../../test/factories';
import { resistorAt } from './resistorAt';
import { resistorPlot } from './resistorPlot';

const RESISTOR = resistor().resistor;

function curvesOf(changes: Partial<typeof RESISTOR>, dcVoltage: number) {
  const part = { ...RESISTOR, ...changes };
  return resistorPlot('TR-1', part, resistorAt(part, dcVoltage));
}

describe('a resistor under a direct voltage', () => {
  it('makes excess noise as its noise index says, in every decade', () => {
    expect(resistorAt({ ...RESISTOR, noiseIndex: 0 }, 10).excessRms).toBeCloseTo(10e-6, 12);
  });

  it('has equal densities where they are said to cross', () => {
    const { crossover, temperature } = resistorAt(RESISTOR, 10);
    const excess = excessPowerDensity(RESISTOR.noiseIndex!, 10, crossover!);
    expect(Math.sqrt(excess) / thermalVoltageDensity(4700, temperature)).toBeCloseTo(1, 12);
  });

  it('warms itself by its share of the rated temperature rise', () => {
    const { temperature, dissipation } = resistorAt(RESISTOR, 10);
    expect(dissipation).toBeCloseTo(100 / 4700, 12);
    expect(temperature).toBeCloseTo(298.15 + (60 * dissipation) / 0.125, 9);
  });

  it('is told when it would stand more than its rating', () => {
    expect(resistorAt(RESISTOR, 24).isOverRating).toBe(false);
    expect(resistorAt(RESISTOR, 25).isOverRating).toBe(true);
    expect(resistorAt({ ...RESISTOR, powerRating: null }, 1000).isOverRating).toBe(false);
  });

  it('has no excess noise that anybody could state without a noise index', () => {
    expect(resistorAt({ ...RESISTOR, noiseIndex: null }, 1)).toMatchObject({
      excessRms: null,
      crossover: null,
    });
  });
});

describe('the plot of a resistor', () => {
  it('shows both noises and where they are equal', () => {
    const plot = curvesOf({}, 2);
    expect(plot.curves.map(({ name }) => name)).toEqual(['thermal', 'excess at 2\u2009V']);
    expect(plot.mark?.at).toBe(resistorAt(RESISTOR, 2).crossover);
  });

  it.each([
    ['without a direct voltage', {}, 0],
    ['where the noise index is unknown', { noiseIndex: null }, 5],
  ])('shows thermal noise alone %s', (_when, changes, dcVoltage) => {
    const plot = curvesOf(changes, dcVoltage);
    expect(plot.curves.map(({ name }) => name)).toEqual(['thermal']);
    expect(plot.mark).toBeUndefined();
  });

  it('marks nothing where the noises are equal outside of it', () => {
    const plot = curvesOf({ noiseIndex: -60 }, 0.01);
    expect(plot.curves).toHaveLength(2);
    expect(plot.mark).toBeUndefined();
  });
});
