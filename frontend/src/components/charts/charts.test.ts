import { describe, expect, it } from 'vitest';
import { axisName, tickText } from './axisText';
import type { CurvesPlot } from './curve';
import { placeLabels } from './labelPlacement';
import { decadesAround, logSteps } from './logRange';
import { plotCsv } from './plotCsv';
import { percentText } from './shares';

const plot: CurvesPlot = {
  title: 'Noise',
  x: { label: 'frequency', kind: 'frequency' },
  y: { label: 'density', kind: 'voltageNoiseDensity' },
  curves: [
    { name: 'floor', points: [[1, 2e-9], [10, 2e-9]], colour: 'slate', stroke: 'thick' }, // prettier-ignore
    { name: '=1+1 "A", B', points: [[1, 5e-9]], colour: 'damson', stroke: 'solid' }, // prettier-ignore
  ],
};

describe('a plot as CSV', () => {
  it('has a column for each curve, in SI units', () => {
    const [, first, second] = plotCsv(plot).split('\r\n');
    expect(first).toBe('1,2e-9,5e-9');
    expect(second).toBe('10,2e-9,');
  });

  it('quotes names and never lets one be a formula', () => {
    expect(plotCsv(plot).split('\r\n')[0]).toBe(`frequency (Hz),floor (V/√Hz),"'=1+1 ""A"", B (V/√Hz)"`);
  });
});

describe('axes', () => {
  it('label ticks with prefix but without unit, and name the unit', () => {
    expect([1e-8, 1, 1e4].map((value) => tickText(value, 'voltage'))).toEqual([
      '10\u2009n',
      '1',
      '10\u2009k',
    ]);
    expect(axisName('frequency', 'frequency')).toBe('frequency, Hz');
  });

  it('cover whole decades', () => {
    expect(decadesAround([3e-9, 0, 4e-8])).toEqual([1e-9, 1e-7]);
    expect(decadesAround([1e-9])).toEqual([1e-9, 1e-8]);
    expect(decadesAround([])).toEqual([0.1, 1]);
    expect(logSteps(1, 1000, 1).map((value) => Math.round(value))).toEqual([1, 10, 100, 1000]);
  });
});

describe('labels at curves', () => {
  it('stand clear of the other curves and of each other', () => {
    const level = (y: number) => logSteps(1, 1e6, 10).map((x): [number, number] => [x, y]);
    const curves = [1e-9, 1.2e-9, 1.4e-9].map((y, index) => ({
      name: `curve ${index}`,
      points: level(y),
      colour: 'ink' as const,
      stroke: 'solid' as const,
    }));
    const places = placeLabels(curves, { x: [1, 1e6], y: [1e-10, 1e-8], width: 300, height: 200 });
    expect(places[0]?.verticalAlign).toBe('top');
    expect(places[2]?.verticalAlign).toBe('bottom');
    expect(
      placeLabels([{ ...curves[0], points: [] }], { x: [1, 2], y: [1, 2], width: 9, height: 9 }),
    ).toEqual([null]);
  });
});

describe('percentages', () => {
  it('are whole, or one digit below one percent', () => {
    expect([0.714, 0.01, 0.004, 0.0002, 1].map((share) => percentText(share).replace('\u2009', ' '))).toEqual(
      ['71 %', '1 %', '0.4 %', '<0.1 %', '100 %'],
    );
  });
});
