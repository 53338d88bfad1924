import type { RankingRequest } from '@roothertz/common/conditions';
import { describe, expect, it } from 'vitest';
import { rankedItem, rankingOf } from '../../test/rankings';
import { followingSentences, leadSentence, leftToGain, plainText, unbroken } from './answer';
import { emptyAdvice, leftOutText, reasonsText } from './exclusionWords';

/** A 1 kΩ source at 290 K in 10 kHz makes 400 nV: 4kTR is 4.002 nV/√Hz (noise-model.md). */
const REQUEST: RankingRequest = {
  conditions: {
    source: { resistance: 1000, inductance: 0, capacitance: 0 },
    ambientTemperature: 290,
    band: { lower: 1, upper: 10001, lowPassOrder: 0 },
    stage: { topology: 'non-inverting', gain: 1 },
    referenceFrequency: 1000,
    bandwidthMargin: 3,
    amplifierTemperatureModel: 'none',
  },
};

/** Only voltage noise as large as the source's: 3.01 dB above the floor. */
const EQUAL = {
  voltageNoise: 4.002e-9,
  voltageNoiseCorner: 0,
  currentNoise: 0,
  gainBandwidth: null,
  inputCapacitance: 0,
};

const leader = rankedItem(REQUEST, 1, 'VR-1108', EQUAL);
const plain = (text: string) => text.replaceAll('\u2009', ' ');

function follow(request: RankingRequest, more: Parameters<typeof rankingOf>[2] = {}, items = [leader]) {
  return plain(followingSentences(rankingOf(request, items, more), items, request));
}

function cheapestOf(part: object) {
  const unitPrice = { amount: '1.85', currency: 'EUR' };
  return { part, unitPrice, aboveQuietest: 0.2 } as NonNullable<ReturnType<typeof rankingOf>['cheapest']>;
}

describe('the answer', () => {
  it('names the cheapest of those that can’t be told apart, and its price', () => {
    const cheapest = cheapestOf({ partNumber: 'HT-2013' });
    expect(follow(REQUEST, { cheapest, quietSet: { total: 4 }, total: 9 })).toMatch(
      /^3 parts can’t be told apart from it\. The cheapest of them is HT-2013 at €1\.85\./,
    );
    expect(follow(REQUEST, { cheapest, quietSet: { total: 1 }, total: 9 })).toMatch(/It costs €1\.85\./);
  });

  it('says where the quietest is the cheapest of them itself', () => {
    const cheapest = cheapestOf(leader.part);
    expect(follow(REQUEST, { cheapest, quietSet: { total: 2 }, total: 9 })).toMatch(
      /^1 part can’t be told apart from it\. None of them is cheaper than it, at €1\.85\./,
    );
  });

  it('names the quietest part, its noise and its distance from the floor', () => {
    const pieces = leadSentence(leader, REQUEST);
    expect(plain(plainText(pieces))).toBe(
      'Quietest is VR-1108: 566 nV rms, 3.01 dB above what the source itself makes.',
    );
    expect(plain(pieces.find(({ strong }) => strong)!.text)).toBe('VR-1108: 566 nV rms');
  });

  it('states currents in a transimpedance stage, and no distance from a floor that there isn’t', () => {
    const request: RankingRequest = {
      conditions: {
        ...REQUEST.conditions,
        source: { resistance: 1e6, inductance: 0, capacitance: 0 },
        stage: { topology: 'transimpedance', feedbackResistance: 1e6, feedbackCapacitance: 0 },
      },
    };
    expect(plainText(leadSentence(rankedItem(request, 1, 'A'), request))).toMatch(/A: [\d.]+\u2009pA rms, /);
    const silent = { ...leader, aboveFloor: null };
    expect(plainText(leadSentence(silent, REQUEST))).toMatch(/, from a source that makes no noise itself\.$/);
  });

  it('counts the parts beside the leader without the leader', () => {
    expect(follow(REQUEST, { total: 9, quietSet: { total: 5 } })).toMatch(
      /^4 parts can’t be told apart from it\./,
    );
    expect(follow(REQUEST, { total: 9, quietSet: { total: 2 } })).toMatch(/^1 part can’t/);
    expect(follow(REQUEST, { total: 9, quietSet: { total: 1 } })).toMatch(/^It stands out/);
    expect(follow(REQUEST)).toMatch(/^It is the only part/);
  });

  it('says how much a better amplifier gains at most', () => {
    expect(leftToGain(leader.contributions)).toBeCloseTo(3.01, 2);
    expect(follow(REQUEST)).toContain(
      '50 % of the noise is the source’s: a better amplifier gains at most 3.01 dB.',
    );
  });

  it('counts what meets the target', () => {
    const loud = rankedItem(REQUEST, 2, 'LQ-12', { ...EQUAL, voltageNoise: 40e-9 });
    const at = (inputNoiseRms: number): RankingRequest => ({ ...REQUEST, target: { inputNoiseRms } });
    expect(follow(at(1e-6), {}, [leader, loud])).toMatch(/1 part meets the target of 1\.00 µV\.$/);
    expect(follow(at(500e-9), {}, [leader, loud])).toMatch(/No part meets the target of 500 nV\.$/);
    expect(follow(at(100e-9), {}, [leader, loud])).toMatch(/No part can .* the source alone makes 400 nV\.$/);
    expect(follow(at(1), { total: 300 }, [leader, loud])).toMatch(/2 parts or more meet the target/);
  });
});

describe('the parts left out', () => {
  const excluded = {
    total: 14,
    reasons: [
      { reason: 'too-slow' as const, count: 3 },
      { reason: 'supply-out-of-range' as const, count: 11 },
    ],
  };

  it('are counted by reason, the most frequent first', () => {
    expect(leftOutText(excluded)).toBe('14 parts left out');
    expect(leftOutText({ total: 1, reasons: [] })).toBe('1 part left out');
    expect(reasonsText(excluded)).toBe('11 supply out of range, 3 too slow for the band');
  });

  it('say which limit to change where nothing is ranked', () => {
    expect(emptyAdvice(excluded, undefined)).toBe(
      'All 14 parts are left out. 11 of them: supply out of range. Narrow the supply range.',
    );
    expect(emptyAdvice({ total: 0, reasons: [] }, 'zz')).toContain('No part contains “zz”');
  });
});

describe('the figures of an answer', () => {
  it('are never parted from their units, nor a count within', () => {
    expect(unbroken('5.6\u2009kΩ of 45\u2009639')).toBe('5.6\u202fkΩ of 45\u202f639');
  });
});
