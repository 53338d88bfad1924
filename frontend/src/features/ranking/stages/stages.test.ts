import { describe, expect, it } from 'vitest';
import type { StageRanking, StageRequest, WholeStage } from '../../../api/stages';
import { EXAMPLE } from '../../../test/exampleRanking';
import { rankedStage, stageRankingOf } from '../../../test/stages';
import { plainText } from '../answer';
import { stageAnswer } from './stageAnswer';
import { stageParts, unsoughtParts } from './stagePartRows';
import { stagePricePlot } from './stagePricePlot';
import { stageRows } from './stageRows';

const { gainResistance: _sought, ...stage } = EXAMPLE.conditions.stage;
const REQUEST: StageRequest = {
  conditions: {
    ...EXAMPLE.conditions,
    stage: {
      ...stage,
      gainTolerance: 0.01,
      network: { minimumTotal: 500, maximumTotal: 100e3 },
      parallelMaximum: 1,
    },
  },
  filter: {},
};
const leader = rankedStage(REQUEST, 1, 'VR-1108');

function shown(more: Partial<StageRanking> = {}, items = [leader], request = REQUEST) {
  return { request, first: { ...stageRankingOf(request, items, more), request }, items };
}

function priced<Stage extends WholeStage>(stage: Stage, amount: string): Stage {
  return { ...stage, unitPrice: { amount, currency: 'EUR', total: amount, isStale: false } };
}

const plain = (text: string) => text.replaceAll('\u2009', ' ');
const lead = (...given: Parameters<typeof shown>) => plain(plainText(stageAnswer(shown(...given)).lead));
const following = (...given: Parameters<typeof shown>) => plain(stageAnswer(shown(...given)).following);

describe('the answer of whole stages', () => {
  it('names the op-amp, its network and its noise', () => {
    expect(lead()).toMatch(
      /^Quietest is VR-1108 with 5 Ω and 500 Ω: [\d.]+ nV rms, [\d.]+ dB above what the source itself makes\.$/,
    );
    expect(following()).toBe(
      'The gain is 101, 1.0 % above the wanted one. 1 op-amp is ranked, with the quietest of 1234 resistor pairs that give it.',
    );
  });

  it('says what it costs, and what the cheapest of all would save and spoil', () => {
    const dear = priced(leader, '8.2000');
    const cheap = priced({ ...leader, inputNoiseRms: leader.inputNoiseRms * 2 }, '1.2200');
    const sentences = (...given: Parameters<typeof shown>) => following(...given).split('. ')[1];
    expect(sentences({ frontier: [dear, cheap] }, [dear])).toBe(
      'The stage costs €8.20; the cheapest stage of all costs €1.22 and is 6.02 dB noisier',
    );
    expect(sentences({ frontier: [cheap] }, [leader])).toMatch(/^The stage has no price; the cheapest/);
    expect(sentences({ frontier: [cheap] }, [cheap])).toBe('The stage costs €1.22: no stage is cheaper');
  });

  it('leads with the price where they are sorted by it', () => {
    const request = { ...REQUEST, sort: 'unitPrice' as const, within: 1 };
    const cheap = priced(leader, '1.2200');
    expect(lead({ frontier: [cheap] }, [cheap], request)).toMatch(
      /^Cheapest within 1 dB of the quietest is VR-1108 with 5 Ω and 500 Ω: €1\.22, [\d.]+ nV rms,/,
    );
    expect(following({ frontier: [cheap] }, [cheap], request)).toBe(
      'The gain is 101, 1.0 % above the wanted one. No stage is cheaper. 1 op-amp makes a stage within 1 dB, with the cheapest of 1234 resistor pairs that give it.',
    );
    expect(lead({}, [leader], request)).toMatch(/^Quietest is VR-1108/);
    expect(following({}, [leader], request)).toContain('None of these stages has a price.');
  });

  it('tells of channels in parallel', () => {
    expect(lead({}, [{ ...leader, channelsInParallel: 4 }])).toContain('500 Ω, 4 channels in parallel: ');
  });

  it('says which gain is nearest where no pair gives it, and the tolerance that takes it', () => {
    expect(lead({ pairs: 0, nearestGain: 103.21 }, [])).toBe('No resistor pair gives a gain of 100.');
    expect(following({ pairs: 0, nearestGain: 103.21 }, [])).toMatch(
      /nearest .* is a gain of 103\.21, 3\.2 % off: widen the tolerance to 4 %/,
    );
  });

  it('offers no tolerance beyond what a tolerance can be', () => {
    const advice = following({ pairs: 0, nearestGain: 12 }, []);
    expect(advice).toMatch(/a gain of 12, 88 % off: raise “network at most”/);
    expect(advice).not.toContain('tolerance');
  });

  it('says what to change where the library has no resistor within the limits', () => {
    expect(following({ pairs: 0, nearestGain: null }, [])).toMatch(/hold no resistors .* add resistors\.$/);
  });

  it('says what to change where every op-amp is left out', () => {
    const excluded = { total: 3, reasons: [{ reason: 'too-slow' as const, count: 3 }] };
    expect(lead({ excluded, total: 0 }, [])).toBe('No stage is ranked.');
    expect(following({ excluded, total: 0 }, [])).toMatch(/^All 3 parts are left out\./);
  });

  it('speaks of one resistor in a transimpedance stage', () => {
    const { gain: _gain, ...rest } = REQUEST.conditions.stage;
    const sought = { ...rest, topology: 'transimpedance' as const, feedbackResistance: 1e9 };
    const request = { ...REQUEST, conditions: { ...REQUEST.conditions, stage: sought } };
    expect(lead({ pairs: 0, nearestGain: null }, [], request)).toBe('No resistor gives 1 GΩ.');
  });
});

describe('the rows of whole stages', () => {
  it('stand under the source floor in one unit', () => {
    const { unit, floor, rows } = stageRows(shown());
    expect(unit).toBe('nV');
    expect(floor.noise.aboveFloor).toBe('0.00\u2009dB');
    expect(
      rows[0].network.map(({ symbol, value, partNumber }) => [symbol, plain(value), partNumber]),
    ).toEqual([
      ['R_g', '5 Ω', 'TN-5R00'],
      ['R_f', '500 Ω', 'TN-500R'],
    ]);
    expect(rows[0].gain).toEqual({ text: '101', channelsInParallel: 1 });
  });

  it('have a price where any stage has one, and say of which part it is missing', () => {
    expect(stageRows(shown()).priceHeading).toBeNull();
    const { priceHeading, rows } = stageRows(shown({ frontier: [priced(leader, '1.22')] }));
    expect(priceHeading).toBe('€ at 1');
    expect(rows[0].price).toEqual({
      text: 'no price',
      title: '1 × VR-1108: no price\n1 × TN-5R00: no price\n1 × TN-500R: no price',
    });
  });

  it('say the library of parts whose number two libraries have', () => {
    const twin = { ...leader, rank: 2, part: { ...leader.part, id: '99', library: 'curated' as const } };
    const { gainResistor } = leader.network;
    const own = { ...gainResistor!, id: '903', library: 'curated' as const };
    const items = [leader, { ...twin, network: { ...twin.network, gainResistor: own } }];
    const { rows } = stageRows(shown({}, items));
    expect(rows.map(({ part }) => part.library)).toEqual(['own', 'curated']);
    expect(rows.map(({ network }) => network[0].partNumber)).toEqual(['TN-5R00 (own)', 'TN-5R00 (curated)']);
    expect(rows[0].network[1].partNumber).toBe('TN-500R');
    expect(stagePricePlot(shown({}, items)).unpriced.map(({ partNumber }) => partNumber)).toEqual([
      'VR-1108 (own)',
      'VR-1108 (curated)',
    ]);
  });
});

describe('the parts of a stage', () => {
  it('say value, tolerance and library, and what the price is without', () => {
    const stage = {
      ...leader,
      unsought: [
        { place: 'difference' as const, pieces: 4, value: 10e3 },
        { place: 'averaging' as const, pieces: 2, value: null },
      ],
    };
    expect(stageParts(stage)[1]).toMatchObject({ name: 'TN-5R00', library: 'own' });
    expect(plain(stageParts(stage)[1].symbols)).toMatch(/^5 Ω ±[\d.]+ %$/);
    expect(unsoughtParts(stage).map(({ symbols, pieces }) => `${pieces} ${plain(symbols)}`)).toEqual([
      '4 × R_d 10 kΩ',
      '2 × R',
    ]);
  });
});
