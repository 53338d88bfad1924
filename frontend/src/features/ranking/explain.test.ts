import { evaluateStage } from '@roothertz/common/noise';
import { describe, expect, it } from 'vitest';
import { EXAMPLE } from '../../test/exampleRanking';
import { opAmp } from '../../test/factories';
import { explainDominant } from './explain';

const { amplifier } = opAmp();

function explained(changes: Partial<typeof EXAMPLE.conditions>, part = amplifier): string {
  const conditions = { ...EXAMPLE.conditions, ...changes };
  return explainDominant(conditions, part, evaluateStage(conditions, part)).replaceAll('\u2009', ' ');
}

const silent = { resistance: 1, inductance: 0, capacitance: 0 };

describe('the sentence on the dominant contributor', () => {
  it('says that no amplifier takes the source’s noise away', () => {
    expect(explained({})).toMatch(
      /^The source itself makes \d\d % of the noise: no amplifier takes that away/,
    );
  });

  it('says what a tenth of the feedback network would bring', () => {
    const stage = { topology: 'non-inverting', gain: 100, gainResistance: 1000 } as const;
    expect(explained({ stage, source: silent })).toMatch(
      /^The feedback network makes \d\d % of the noise: 100 Ω instead of 1 kΩ would bring it to \d\d %\.$/,
    );
  });

  it('names the difference resistors of an instrumentation stage where they are the louder ones', () => {
    const stage = { topology: 'instrumentation', gain: 2, gainResistance: 100 } as const;
    expect(explained({ stage, source: silent })).toMatch(
      /^The feedback network makes \d\d % of the noise: 1 kΩ instead of 10 kΩ would bring it to \d\d %\.$/,
    );
    const loud = { ...stage, gain: 100, gainResistance: 10e3, differenceResistance: 20e3 };
    expect(explained({ stage: loud, source: silent })).toContain(': 1 kΩ instead of 10 kΩ');
  });

  it('asks for a lower e_n or a lower i_n', () => {
    expect(explained({ source: silent })).toMatch(/voltage noise .* lower e_n/);
    expect(explained({ source: { ...silent, resistance: 1e6 } })).toMatch(/current noise .* JFET or CMOS/);
  });

  it('asks a difference stage for a lower network where the current noise of its + input prevails', () => {
    const stage = { topology: 'difference', gain: 10, gainResistance: 1e6 } as const;
    const part = { ...amplifier, currentNoise: 1e-11 };
    expect(explained({ stage, source: silent }, part)).toMatch(/current noise .* lower network/);
  });

  it('names 1/f noise where it prevails in the band', () => {
    const slow = { lower: 0.1, upper: 10, lowPassOrder: 0 };
    const part = { ...amplifier, voltageNoiseCorner: 200 };
    expect(explained({ source: silent, band: slow, referenceFrequency: 1 }, part)).toContain(
      'most of it 1/f noise',
    );
  });
});
