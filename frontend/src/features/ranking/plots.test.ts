import { evaluateStage, sourceFloor } from '@roothertz/common/noise';
import { describe, expect, it } from 'vitest';
import { EXAMPLE, exampleRanking } from '../../test/exampleRanking';
import { comparedWith } from './comparedPart';
import { frequencyPlot } from './frequencyPlot';
import { resistancePlot, resistanceRange } from './resistancePlot';

const { conditions } = EXAMPLE;
const { items } = exampleRanking();
const [selected, compared] = items.map(({ part }) => part);

describe('noise over source resistance', () => {
  const plot = resistancePlot(conditions, selected, compared);

  it('passes through the ranking’s own figures at the present resistance', () => {
    const at = (curve: number) => plot.curves[curve].points.find(([x]) => Math.abs(x / 1000 - 1) < 1e-9)![1];
    expect(at(0)).toBeCloseTo(sourceFloor(conditions).inputNoiseRms, 15);
    expect(at(2)).toBeCloseTo(evaluateStage(conditions, selected.amplifier).inputNoiseRms, 15);
    expect(plot.mark?.at).toBe(1000);
  });

  it('draws floor, compared and selected part apart by more than colour', () => {
    expect(plot.curves.map(({ name, stroke }) => [name, stroke])).toEqual([
      ['source floor', 'thick'],
      ['LQ-12', 'dashed'],
      ['VR-1108', 'solid'],
    ]);
  });

  it.each([0, 0.02, 1, 375, 1e6, 5e8, 1e13])('keeps the present resistance of %d Ω in sight', (present) => {
    const [from, to] = resistanceRange(present);
    expect(to / from).toBeCloseTo(1e6);
    if (present > 0) expect(from <= present && present <= to).toBe(true);
  });
});

describe('density over frequency', () => {
  const plot = frequencyPlot(conditions, selected, null);

  it('shows the band and a part of what is around it', () => {
    const xs = plot.curves[0].points.map(([x]) => x);
    expect(Math.min(...xs)).toBeLessThan(conditions.band.lower);
    expect(Math.max(...xs)).toBeGreaterThan(conditions.band.upper);
  });

  it('has the floor below the part everywhere', () => {
    const [floor, part] = plot.curves;
    expect(floor.points.every(([, y], index) => y < part.points[index][1])).toBe(true);
  });
});

describe('the compared part', () => {
  const ranked = ['a', 'b', 'c'].map((id, index) => ({ part: { id }, quietSet: index < 2 }));

  it('is the leader, or the first beyond the quiet set where the leader is selected', () => {
    expect(comparedWith('c', ranked)?.id).toBe('a');
    expect(comparedWith('a', ranked)?.id).toBe('c');
    expect(comparedWith('a', ranked.slice(0, 2))?.id).toBe('b');
    expect(comparedWith('a', ranked.slice(0, 1))).toBeNull();
  });

  it('is never the selected part, where the first by price is not among the quiet', () => {
    const byPrice = ranked.map((item, index) => ({ ...item, quietSet: index === 1 }));
    expect(comparedWith('a', byPrice)?.id).toBe('c');
  });
});
