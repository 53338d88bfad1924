import { checkResistorConditions } from '@roothertz/common/conditions';
import { checkStageSearch } from '@roothertz/common/noise';
import { describe, expect, it } from 'vitest';
import { exampleRequest } from '../exampleRequest';
import { withValue } from '../requestPath';
import { STAGE_KINDS } from '../stageKind';
import { placesOf } from './placesOf';
import {
  readSearch,
  readSort,
  readTechnologies,
  readTolerance,
  readView,
  withSearch,
  withSort,
  withTechnologies,
  withTolerance,
  withView,
} from './searchAddress';
import { PLACE_KEYS, STAGE_SEARCH_KEYS } from './searchKeys';
import { resistorRequest, stageRequest } from './stageSearch';

const params = (query: string) => new URLSearchParams(query);
const usualSearch = readSearch(params(''), STAGE_SEARCH_KEYS).values;
const BY_NOISE = { sort: 'inputNoiseRms', technologies: [], tolerance: null } as const;
const usualPlace = readSearch(params(''), PLACE_KEYS).values;

describe('the address beside the conditions', () => {
  it('gives back the fields that it was written from, and keeps the rest', () => {
    const values = { gtol: 0.005, nmax: 47e3, par: 4, within: 2 };
    const written = withSearch(params('stage=follower'), STAGE_SEARCH_KEYS, values);
    expect(readSearch(params(written.toString()), STAGE_SEARCH_KEYS)).toEqual({
      values,
      messages: new Map(),
    });
    expect(written.get('stage')).toBe('follower');
  });

  it('is free of what is as usual', () => {
    const written = withSearch(params('r=4k7&vr=2'), PLACE_KEYS, { r: 1000, vr: 0 });
    expect(written.toString()).toBe('');
    expect(withView(params('view=stages'), 'op-amps').toString()).toBe('');
  });

  it('falls back to the usual value and says at the field what it could not read', () => {
    const { values, messages } = readSearch(params('gtol=much&par=99'), STAGE_SEARCH_KEYS);
    expect(values).toEqual(usualSearch);
    expect(messages.get('conditions.stage.gainTolerance')).toMatch(/^the address said “much”/);
    expect(messages.has('conditions.stage.parallelMaximum')).toBe(true);
  });

  it('names the view, and op-amps where it names none that is known', () => {
    expect(readView(params('view=resistors'))).toBe('resistors');
    expect(readView(params('view=valves'))).toBe('op-amps');
  });
});

describe('the choices of the address', () => {
  it('are written only where they aren’t as usual, and unknown words are passed over', () => {
    const written = withTechnologies(withSort(params(''), 'unitPrice'), ['thin-film', 'metal-foil']);
    expect(written.toString()).toBe('by=unitPrice&tech=thin-film+metal-foil');
    expect(readSort(written)).toBe('unitPrice');
    expect(readTechnologies(written)).toEqual(['metal-foil', 'thin-film']);
    expect(withTechnologies(withSort(written, 'inputNoiseRms'), []).toString()).toBe('');
    expect(readSort(params('by=luck'))).toBe('inputNoiseRms');
    expect(readTechnologies(params('tech=unobtainium'))).toEqual([]);
    expect(readTolerance(withTolerance(params(''), 0.0005))).toBe(0.0005);
    expect(readTolerance(params('tol=wide'))).toBeNull();
  });
});

describe('a search for whole stages', () => {
  it('is sorted by price within so many dB, with the technologies that count', () => {
    const choices = { sort: 'unitPrice', technologies: ['thin-film'], tolerance: 0.005 } as const;
    const request = stageRequest(exampleRequest('non-inverting'), { ...usualSearch, within: 2 }, choices);
    expect(request).toMatchObject({ sort: 'unitPrice', within: 2, quantity: 1 });
    expect(request.resistorFilter).toEqual({ technology: ['thin-film'], tolerance: 0.005 });
  });

  it.each(STAGE_KINDS)('can be ranked as it stands, for the %s example', (kind) => {
    const { conditions, filter } = stageRequest(
      exampleRequest(kind),
      { ...usualSearch, nmax: 1e9 },
      BY_NOISE,
    );
    expect(checkStageSearch(conditions, filter)).toEqual([]);
    expect(conditions.stage).not.toHaveProperty('gainResistance');
  });

  it('keeps what the output drives, and 500 Ω where nothing is stated', () => {
    const example = exampleRequest('non-inverting');
    const stated = withValue(example, 'conditions.stage.network.minimumTotal', 2000);
    expect(stageRequest(example, usualSearch, BY_NOISE).conditions.stage.network.minimumTotal).toBe(500);
    expect(stageRequest(stated, usualSearch, BY_NOISE).conditions.stage.network.minimumTotal).toBe(2000);
  });

  it('takes the direct output voltage, but no noise index: those are of the resistors that are found', () => {
    const stated = withValue(exampleRequest('non-inverting'), 'conditions.stage.outputVoltage', -2.5);
    const { stage } = stageRequest(
      withValue(stated, 'conditions.stage.gainNoiseIndex', -20),
      usualSearch,
      BY_NOISE,
    ).conditions;
    expect(stage.outputVoltage).toBe(-2.5);
    expect(stage).not.toHaveProperty('gainNoiseIndex');
  });

  it('limits no network of a transimpedance stage, whose resistor is wanted as it is', () => {
    const { conditions } = stageRequest(exampleRequest('transimpedance'), usualSearch, BY_NOISE);
    expect(conditions.stage.network.maximumTotal).toBeGreaterThan(1e12);
  });

  it('joins channels only where their sources can be joined', () => {
    const four = { ...usualSearch, par: 4 };
    const most = (kind: 'non-inverting' | 'inverting') =>
      stageRequest(exampleRequest(kind), four, BY_NOISE).conditions.stage.parallelMaximum;
    expect([most('non-inverting'), most('inverting')]).toEqual([4, 1]);
  });

  it('takes lifecycle and approval for resistors too, but not what names op-amps', () => {
    const filtered = {
      ...exampleRequest('follower'),
      filter: { search: 'LQ', lifecycle: ['active' as const] },
    };
    expect(stageRequest(filtered, usualSearch, BY_NOISE).resistorFilter).toEqual({ lifecycle: ['active'] });
  });
});

describe('the place of a resistor', () => {
  it('has band and temperature of the conditions', () => {
    const request = resistorRequest(
      exampleRequest('non-inverting'),
      { ...usualPlace, r: 4700 },
      {
        technologies: ['metal-foil'],
        tolerance: null,
      },
    );
    expect(checkResistorConditions(request)).toEqual([]);
    expect(request.filter).toEqual({ technology: ['metal-foil'] });
    expect(request.conditions).toMatchObject({
      resistance: 4700,
      band: { upper: 20e3 },
      ambientTemperature: 298.15,
    });
  });

  it('can be any resistor of the stage that has a value', () => {
    const loaded = withValue(exampleRequest('non-inverting'), 'conditions.stage.loadResistance', 47e3);
    expect(placesOf(loaded)).toEqual([
      { symbol: 'R_g', resistance: 10 },
      { symbol: 'R_f', resistance: 990 },
      { symbol: 'R_L', resistance: 47e3 },
    ]);
    expect(placesOf(exampleRequest('transimpedance'))).toEqual([{ symbol: 'R_f', resistance: 1e6 }]);
  });
});
