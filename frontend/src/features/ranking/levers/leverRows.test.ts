import { evaluateStage } from '@roothertz/common/noise';
import { describe, expect, it } from 'vitest';
import { exampleRanking } from '../../../test/exampleRanking';
import { atBestText, changeText, leverRows, nextQuieter } from './leverRows';

const { request, items } = exampleRanking();
const [leader, second] = items;
const plain = (text: string) => text.replaceAll('\u2009', ' ');

describe('levers as rows', () => {
  const rows = leverRows(request, second.part, leader.part);

  it('have those that help most first, with their sign', () => {
    expect(rows.length).toBeGreaterThan(4);
    const changes = rows.map(({ change }) => Number(change.replace('−', '-').replace(/[+\u2009dB]/g, '')));
    expect(changes).toEqual([...changes].sort((one, other) => one - other));
    expect(plain(rows[0].change)).toMatch(/^−[\d.]+ dB$/);
  });

  it('try what is a change of conditions, and the tried conditions make the change', () => {
    const tried = rows.find(({ key }) => key === 'halve-band')!;
    if (tried.act.kind !== 'try') throw new Error('it can’t be tried');
    const noise = evaluateStage(tried.act.request.conditions, second.part.amplifier).inputNoiseRms;
    expect(tried.change).toBe(changeText(20 * Math.log10(noise / second.inputNoiseRms)));
    expect(tried.act.request.quantity).toBe(request.quantity);
  });

  it('select the quieter part, and only tell of what takes another circuit', () => {
    const acts = Object.fromEntries(rows.map(({ key, act }) => [key, act]));
    expect(acts['quieter-part']).toEqual({ kind: 'select', partId: leader.part.id });
    expect(acts.parallel).toEqual({ kind: 'none' });
  });

  it('name no quieter part for the leader', () => {
    expect(nextQuieter(leader.part.id, items)).toBeUndefined();
    expect(nextQuieter(second.part.id, items)).toBe(leader.part);
    expect(nextQuieter('unranked', items)).toBeUndefined();
  });
});

describe('a change in decibels', () => {
  it('has a true sign, and none where it is nothing', () => {
    expect([-2.94, -0.04, 0.31, 12].map((change) => plain(changeText(change)))).toEqual([
      '−2.9 dB',
      '0.0 dB',
      '+0.3 dB',
      '+12.0 dB',
    ]);
  });

  it('is a dash where a perfect amplifier would leave nothing', () => {
    expect(atBestText(Infinity)).toBe('–');
  });
});
