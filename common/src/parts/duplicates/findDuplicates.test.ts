import { describe, expect, it } from 'vitest';
import { likelihoodWords } from './duplicateReasons.js';
import { type ComparedPart, findDuplicates } from './findDuplicates.js';
import { makerLikeness, SIMILAR_MAKERS } from './makerLikeness.js';
import { baseNumber, lookOf } from './partNumberForms.js';

const part = (manufacturer: string, partNumber: string, more: Partial<ComparedPart> = {}): ComparedPart => ({
  manufacturer,
  partNumber,
  package: 'SOIC-8',
  figures: [1e-9, 2e-12, null, 4e7],
  nominal: null,
  isOwn: true,
  ...more,
});
const reasonsOf = (...parts: ComparedPart[]) => findDuplicates(parts).map(({ reasons }) => reasons);
const OTHER = { figures: [1e-9, 2e-12, 3, 5e7] };

describe('a part number', () => {
  it.each([
    ['HT-2117-TR', 'HT-2117'],
    ['HT-2117/SOIC-8', 'HT-2117'],
    ['HT-2117 SOIC8#PBF', 'HT-2117'],
    ['SB-K0603-4K70-R7', 'SB-K0603-4K70'],
    ['HT-2117A', 'HT-2117A'],
    ['HT-TR', 'HT-TR'],
  ])('%s is without package and reel %s', (number, base) => {
    expect(baseNumber(number)).toBe(base);
  });

  it('looks alike with O for 0 and I for 1, whatever its case and marks', () => {
    expect(lookOf('KM-IO1')).toBe(lookOf('km 101'));
    expect(lookOf('KM-102')).not.toBe(lookOf('KM-101'));
  });
});

describe('makers', () => {
  it.each([
    ['Hallam', 'Hallam Devices', true],
    ['HALLAM  GmbH', 'Hallam', true],
    ['Soderbrook', 'Soderbrok', true],
    ['Hallam', 'Kestner', false],
    ['Tarn Micro', 'Merrin Devices', false],
  ])('%s and %s are similar: %s', (one, other, similar) => {
    expect(makerLikeness(one, other) >= SIMILAR_MAKERS).toBe(similar);
    expect(makerLikeness(one, other)).toBe(makerLikeness(other, one));
  });
});

describe('parts that may be one', () => {
  it('are the same in both libraries', () => {
    expect(reasonsOf(part('Hallam', 'HT-1'), part('HALLAM Ltd', 'ht 1', { isOwn: false }))).toEqual([
      ['same-part'],
    ]);
  });

  it('have one number under makers of similar names', () => {
    expect(reasonsOf(part('Hallam', 'HT-11'), part('Hallam Devices', 'HT11', OTHER))).toEqual([
      ['same-number'],
    ]);
    expect(reasonsOf(part('Hallam', 'HT-11'), part('Kestner', 'HT11'))).toEqual([]);
  });

  it('have numbers that read alike, or that differ in package and reel', () => {
    expect(reasonsOf(part('Hallam', 'HT-10'), part('Hallam', 'HT-1O', OTHER))).toEqual([['look-alike']]);
    expect(reasonsOf(part('Hallam', 'HT-10'), part('Hallam', 'HT-10-TR'))).toEqual([
      ['suffix', 'same-figures'],
    ]);
  });

  it('have the same maker, package and figures', () => {
    expect(reasonsOf(part('Hallam', 'HT-10'), part('Hallam', 'QX-77'))).toEqual([['same-figures']]);
    expect(reasonsOf(part('Hallam', 'HT-10'), part('Hallam', 'QX-77', { package: 'DIP-8' }))).toEqual([]);
    const little = { figures: [1e-9, null, null, null] };
    expect(reasonsOf(part('Hallam', 'HT-10', little), part('Hallam', 'QX-77', little))).toEqual([]);
  });

  it('don’t contradict each other in most of their figures', () => {
    const different = { figures: [9e-9, 7e-12, null, 4e7] };
    expect(reasonsOf(part('Hallam', 'HT-10'), part('Hallam', 'HT-10-TR', different))).toEqual([]);
  });

  it('have one nominal value', () => {
    const [small, large] = [{ nominal: 1000 }, { nominal: 10_000 }];
    expect(reasonsOf(part('Hallam', 'HR-1O', small), part('Hallam', 'HR-10', large))).toEqual([]);
    expect(reasonsOf(part('Hallam', 'HR-1O', small), part('Hallam', 'HR-10', small))).toHaveLength(1);
  });

  it('are never both curated', () => {
    const curated = { isOwn: false };
    expect(reasonsOf(part('Hallam', 'HT-10', curated), part('Hallam', 'HT-1O', curated))).toEqual([]);
  });

  it('come once each, the own ones first and of these the likeliest', () => {
    const pairs = findDuplicates([
      part('Hallam', 'HT-20', OTHER),
      part('Hallam', 'HT-20/SOIC-8'),
      part('Hallam', 'HT-2O'),
      part('Vireo', 'VR-1'),
      part('Vireo', 'VR-1', { isOwn: false }),
    ]);
    expect(pairs.map(({ one, other }) => [one, other])).toEqual([
      [0, 2],
      [1, 2],
      [0, 1],
      [3, 4],
    ]);
    expect(pairs.map(({ likelihood }) => likelihoodWords(likelihood))).toEqual([
      'likely',
      'likely',
      'possible',
      'very likely',
    ]);
  });

  it('are found quickly where a series shares its figures', () => {
    const series = Array.from({ length: 5000 }, (_, index) => part('Hallam', `HT-${index}0-TR`));
    expect(findDuplicates(series)).toEqual([]);
  });
});
