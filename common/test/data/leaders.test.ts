import { describe, expect, it } from 'vitest';
import { rankAmplifiers, type Ranking } from '../../src/noise/index.js';
import type { Amplifier } from '../../src/parts/index.js';
import { libraryColumns } from './libraryColumns.js';
import { readOpAmps } from './readCsv.js';
import { tarnfield } from './tarnfield.js';

const parts = [readOpAmps('curated/op-amps.csv'), readOpAmps('demo/tarnfield-op-amps.csv')];
const libraries = parts.map(libraryColumns);

function rank(name: string): Ranking {
  const { conditions, filter = {}, target = {} } = tarnfield.conditions.find((c) => c.name === name)!.ranking;
  const page = { sort: 'inputNoiseRms', descending: false, limit: 50, offset: 0 } as const;
  return rankAmplifiers({ conditions, filter, target, ...page }, libraries);
}

/** A figure such as 1.3 in a unit such as 1e-9, rounded to twelve digits as the list writes it. */
const inUnit = (value: number | null, unit: number) => Number((value! / unit).toPrecision(12));

interface Expected {
  name: string;
  why: string;
  accepts: (leader: Amplifier) => boolean;
}

const LEADERS: Expected[] = [
  {
    name: 'River geophone',
    why: 'a coil of 375 Ω makes 2.4 nV/√Hz, so a bipolar below 1.5 nV/√Hz wins and its current noise hardly counts',
    accepts: ({ inputType, voltageNoise }) => inputType === 'bipolar' && inUnit(voltageNoise, 1e-9) <= 1.5,
  },
  {
    name: 'Hydrophone',
    why: '2.2 nF turns current noise into a voltage that rises towards 10 Hz, so a JFET of large area wins',
    accepts: ({ inputType, voltageNoise }) => inputType === 'jfet' && inUnit(voltageNoise, 1e-9) <= 3.5,
  },
  {
    name: 'Pressure cell bridge',
    why: '350 Ω from 0.1 Hz on asks for a low voltage noise and a corner of a few hertz at most',
    accepts: ({ inputType, voltageNoiseCorner }) => inputType === 'bipolar' && voltageNoiseCorner! <= 3,
  },
  {
    name: 'Turbidity photodiode',
    why: '500 MΩ forbids picoamperes of bias noise, so a JFET or CMOS with small voltage noise and capacitance wins',
    accepts: ({ inputType, currentNoise }) =>
      (inputType === 'jfet' || inputType === 'cmos') && inUnit(currentNoise, 1e-15) <= 5,
  },
  {
    name: 'Resistance thermometer',
    why: 'from 0.01 to 5 Hz on a battery of 3 V the zero-drift input wins, since it has no 1/f noise',
    accepts: ({ inputType, voltageNoiseCorner }) => inputType === 'zero-drift' && voltageNoiseCorner === 0,
  },
  {
    name: 'Cooled infrared detector',
    why: '2 kΩ at 77 K makes as much noise as 0.5 kΩ at room temperature, so a bipolar of moderate input current wins',
    accepts: ({ inputType, currentNoise }) => inputType === 'bipolar' && inUnit(currentNoise, 1e-12) <= 1,
  },
];

describe.each(LEADERS.map((leader) => [`${leader.name}: ${leader.why}`, leader] as const))(
  '%s',
  (_title, { name, accepts }) => {
    const ranking = rank(name);
    const [leader] = ranking.items;

    it('is led by a part that an engineer would accept, all of whose noise figures are known', () => {
      const { amplifier } = parts[leader.library][leader.row];
      expect(accepts(amplifier), JSON.stringify(amplifier)).toBe(true);
      expect(leader.figures.cautions).not.toContain('current-noise-unknown');
      expect(leader.figures.cautions).not.toContain('corner-unknown');
    });

    it('ranks more than 20 parts, of which two to eight can’t be told from the quietest', () => {
      expect(ranking.total).toBeGreaterThan(20);
      expect(ranking.quietSetTotal).toBeGreaterThanOrEqual(2);
      expect(ranking.quietSetTotal).toBeLessThanOrEqual(8);
    });

    it('lies above the source floor by a finite figure, and meets the target though not every part does', () => {
      expect(leader.figures.aboveFloor).toBeGreaterThan(0);
      expect(leader.figures.aboveFloor).toBeLessThan(20);
      const verdicts = ranking.items.map(({ meetsTarget }) => meetsTarget);
      expect(verdicts[0]).toBe(true);
      expect(verdicts).toContain(false);
    });
  },
);

it('covers every named condition of the demo team', () => {
  expect(LEADERS.map(({ name }) => name)).toEqual(tarnfield.conditions.map(({ name }) => name));
});
