import { describe, expect, it } from 'vitest';
import { ELEMENTARY_CHARGE, shotPowerDensity } from '../../src/noise/index.js';
import {
  INPUT_TYPES,
  LIFECYCLES,
  normalisePartKey,
  OP_AMP_CATALOGUE,
  type Amplifier,
  type InputType,
  type OpAmpPart,
} from '../../src/parts/index.js';
import { readOpAmps, readRows } from './readCsv.js';

const PATH = 'curated/op-amps.csv';
const parts = readOpAmps(PATH);
const ofType = (type: InputType) => parts.filter(({ amplifier }) => amplifier.inputType === type);
const partNumbers = (which: (part: OpAmpPart) => boolean) =>
  parts.filter(which).map(({ partNumber }) => partNumber);
const overShotNoise = ({ currentNoise, inputBiasCurrent }: Amplifier) =>
  currentNoise! / Math.sqrt(shotPowerDensity(inputBiasCurrent!));

describe('the curated library', () => {
  it('reads without an error in any row', () => {
    expect(readRows(OP_AMP_CATALOGUE, PATH).filter(({ ok }) => !ok)).toEqual([]);
  });

  it('has at least 180 op-amps of eight makers, with every input type, lifecycle and 1 to 4 channels', () => {
    expect(parts.length).toBeGreaterThanOrEqual(180);
    expect(new Set(parts.map(({ manufacturer }) => manufacturer))).toHaveProperty('size', 8);
    for (const type of INPUT_TYPES) expect(ofType(type).length, type).toBeGreaterThanOrEqual(30);
    expect(new Set(parts.map(({ lifecycle }) => lifecycle))).toEqual(new Set(LIFECYCLES));
    expect(new Set(parts.map(({ amplifier }) => amplifier.channels))).toEqual(new Set([1, 2, 3, 4]));
  });

  it('holds no part twice, and only approved parts with a description and a package', () => {
    const keys = parts.map(({ manufacturer, partNumber }) => normalisePartKey(manufacturer, partNumber));
    expect(keys).toHaveLength(new Set(keys).size);
    for (const part of parts) {
      expect(part.approval).toBe('approved');
      expect(part.description).not.toBe('');
      expect(part.package).not.toBe('');
    }
  });

  it('knows every figure, but for a few input capacitances', () => {
    const gaps = parts.flatMap(({ amplifier }) =>
      Object.entries(amplifier).flatMap(([key, value]) => (value === null ? [key] : [])),
    );
    expect(new Set(gaps)).toEqual(new Set(['inputCapacitance']));
    expect(gaps.length).toBeLessThan(10);
  });
});

describe('every curated part', () => {
  it('has a supply range and a minimum stable gain that make sense', () => {
    for (const { partNumber, amplifier } of parts) {
      expect(amplifier.supplyMinimum!, partNumber).toBeLessThan(amplifier.supplyMaximum!);
      expect([1, 5, 10], partNumber).toContain(amplifier.minimumStableGain);
    }
  });

  it('has no current noise under the shot noise of its bias current', () => {
    expect(partNumbers(({ amplifier }) => overShotNoise(amplifier) < 1)).toEqual([]);
  });

  it('has a bipolar input far above that shot noise only where its bias current is cancelled', () => {
    const far = partNumbers(
      ({ amplifier }) => amplifier.inputType === 'bipolar' && overShotNoise(amplifier) > 2,
    );
    expect(far.length).toBeGreaterThan(0);
    expect(far).toEqual(partNumbers(({ description }) => description.includes('bias current cancelled')));
  });

  it('has a zero-drift input well above that shot noise, since its switches inject charge', () => {
    const near = ({ amplifier }: OpAmpPart) =>
      amplifier.inputType === 'zero-drift' && overShotNoise(amplifier) < 2;
    expect(partNumbers(near)).toEqual([]);
  });

  it('is no quieter than the shot noise of its supply current allows', () => {
    // Two devices at half the supply current each, with the transconductance I/(kT/q) that none exceeds.
    const thermalVoltage = 0.0257;
    const least = 8 * ELEMENTARY_CHARGE * thermalVoltage ** 2;
    const quieter = partNumbers(
      ({ amplifier }) => amplifier.voltageNoise ** 2 * amplifier.supplyCurrent! < least,
    );
    expect(quieter).toEqual([]);
  });
});

/** From the product description's ranges; in nV/√Hz, fA/√Hz, Hz and V. */
const RANGES: Record<InputType, { e: Range; i: Range; ce: Range; ci: Range; supply: Range }> = {
  bipolar: { e: [0.8, 4], i: [300, 4000], ce: [1, 30], ci: [30, 400], supply: [2.5, 36] },
  jfet: { e: [2.5, 15], i: [0.5, 5], ce: [20, 150], ci: [0, 0], supply: [4.5, 36] },
  cmos: { e: [4, 40], i: [0.1, 2], ce: [200, 5000], ci: [0, 0], supply: [1.8, 5.5] },
  'zero-drift': { e: [5, 60], i: [5, 100], ce: [0, 0], ci: [0, 0], supply: [1.8, 36] },
};
type Range = readonly [number, number];

describe.each(INPUT_TYPES)('the %s inputs', (type) => {
  it('lie within the ranges of noise, corners and supply that such inputs have', () => {
    const ranges = RANGES[type];
    for (const { partNumber, amplifier } of ofType(type)) {
      within(partNumber, amplifier.voltageNoise * 1e9, ranges.e);
      within(partNumber, amplifier.currentNoise! * 1e15, ranges.i);
      within(partNumber, amplifier.voltageNoiseCorner!, ranges.ce);
      within(partNumber, amplifier.currentNoiseCorner!, ranges.ci);
      within(partNumber, amplifier.supplyMinimum!, ranges.supply);
      within(partNumber, amplifier.supplyMaximum!, ranges.supply);
    }
  });

  it('take more supply current the quieter they are', () => {
    expect(slope(type, ({ supplyCurrent }) => supplyCurrent!)).toBeLessThan(-0.5);
  });
});

describe('the trade of one noise against another', () => {
  it('gives bipolar inputs more current noise the less voltage noise they have', () => {
    expect(slope('bipolar', ({ currentNoise }) => currentNoise!)).toBeLessThan(-0.8);
  });

  it.each(['jfet', 'cmos'] as const)('gives %s inputs more capacitance the quieter they are', (type) => {
    expect(slope(type, ({ inputCapacitance }) => inputCapacitance)).toBeLessThan(-0.5);
  });

  it('makes a decompensated part as quiet as its sibling, and faster about as often as its gain says', () => {
    const decompensated = parts.filter(({ amplifier }) => amplifier.minimumStableGain! > 1);
    expect(decompensated.length).toBeGreaterThan(5);
    for (const part of decompensated) {
      const { amplifier } = part;
      const sibling = siblingOf(part).amplifier;
      expect(sibling.minimumStableGain).toBe(1);
      expect(sibling.voltageNoise).toBe(amplifier.voltageNoise);
      expect(sibling.currentNoise).toBe(amplifier.currentNoise);
      const faster = amplifier.gainBandwidth! / sibling.gainBandwidth!;
      within(part.partNumber, faster / amplifier.minimumStableGain!, [0.7, 1.2]);
    }
  });
});

/** The part that a description such as "Decompensated VR-1136, stable from gain 10" names. */
function siblingOf({ manufacturer, description }: OpAmpPart): OpAmpPart {
  return parts.find(
    (part) =>
      part.manufacturer === manufacturer && description.startsWith(`Decompensated ${part.partNumber},`),
  )!;
}

function within(name: string, value: number, [least, most]: Range): void {
  expect(value, name).toBeGreaterThanOrEqual(least * (1 - 1e-9));
  expect(value, name).toBeLessThanOrEqual(most * (1 + 1e-9));
}

/** Slope of log(figure) over log(e_n) through all parts of a type that know the figure. */
function slope(type: InputType, figure: (amplifier: Amplifier) => number | null): number {
  const points = ofType(type).flatMap(({ amplifier }) => {
    const value = figure(amplifier);
    return value === null ? [] : [[Math.log(amplifier.voltageNoise), Math.log(value)]];
  });
  const mean = (k: number) => points.reduce((sum, point) => sum + point[k], 0) / points.length;
  const [x, y] = [mean(0), mean(1)];
  const covariance = points.reduce((sum, [px, py]) => sum + (px - x) * (py - y), 0);
  return covariance / points.reduce((sum, [px]) => sum + (px - x) ** 2, 0);
}
