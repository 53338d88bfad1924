import { describe, expect, it } from 'vitest';
import { amplifierWith, conditionsWith, libraryOf, type LibraryPart } from '../../../test/support/stages.js';
import type { OperatingConditions, PartFilter } from '../../conditions/index.js';
import type { ExclusionReason } from '../cautions.js';
import { exclusionDetail } from './exclusionDetail.js';
import { findExcluded } from './sift.js';

const DETECTOR = conditionsWith({
  source: { resistance: 1e9, capacitance: 100e-12 },
  stage: { topology: 'transimpedance', gain: undefined, feedbackResistance: 1e6 },
  band: { lowPassOrder: 1 },
  bandwidthMargin: 0,
});

function exclusionOf(
  part: Omit<LibraryPart, 'amplifier'> & { amplifier?: LibraryPart['amplifier'] },
  filter: PartFilter = {},
  conditions: OperatingConditions = conditionsWith(),
): { reason: ExclusionReason; detail: string } | null {
  const library = libraryOf([{ amplifier: amplifierWith(), ...part }]);
  const { items } = findExcluded({ conditions, filter }, [library], { limit: 10, offset: 0 });
  const [excluded] = items;
  if (!excluded) return null;
  const detail = exclusionDetail(excluded.reason, conditions, filter, library, 0);
  return { reason: excluded.reason, detail: detail.replace(/\s/g, ' ') };
}

describe('an exclusion', () => {
  it.each<[ExclusionReason, string, Parameters<typeof exclusionOf>]>([
    [
      'lifecycle',
      'its lifecycle is “obsolete”',
      [{ lifecycle: 'obsolete' }, { lifecycle: ['active', 'not-recommended'] }],
    ],
    [
      'retired',
      'it is retired: obsolete and not approved; tick one of these to rank it',
      [{ lifecycle: 'obsolete', approval: 'not-approved' }],
    ],
    ['approval', 'its approval is “restricted”', [{ approval: 'restricted' }, { approval: ['approved'] }]],
    ['input-type', 'its input is bipolar', [{}, { inputType: ['jfet', 'cmos'] }]],
    [
      'input-type',
      'its input type is unknown',
      [{ amplifier: amplifierWith({ inputType: null }) }, { inputType: ['jfet'] }],
    ],
    ['package', 'its package is MSOP-8', [{ package: 'MSOP-8' }, { package: 'soic' }]],
    ['package', 'its package is unknown', [{}, { package: 'soic' }]],
    ['too-few-channels', 'it has 1 of the 2 channels needed', [{}, { channels: 2 }]],
    [
      'supply-out-of-range',
      'works from 5 V to 36 V, the stage is supplied with 3.3 V to 12 V',
      [{}, { supply: { minimum: 3.3, maximum: 12 } }],
    ],
    [
      'supply-out-of-range',
      'works from an unknown voltage to 36 V, the stage is supplied with 12 V to 48 V',
      [{ amplifier: amplifierWith({ supplyMinimum: null }) }, { supply: { minimum: 12, maximum: 48 } }],
    ],
    [
      'below-minimum-stable-gain',
      'stable from a noise gain of 5 on, this stage has 1',
      [{ amplifier: amplifierWith({ minimumStableGain: 5 }) }],
    ],
    [
      'too-slow',
      'too slow: closed-loop bandwidth 50 kHz, band needs 60 kHz',
      [{ amplifier: amplifierWith({ gainBandwidth: 50e3 }) }],
    ],
    [
      'noise-unbounded',
      'its gain–bandwidth product is unknown, and without it the noise of this stage rises beyond what a ' +
        'first-order low-pass takes away: state it, or choose a second-order low-pass',
      [{ amplifier: amplifierWith({ gainBandwidth: null, minimumStableGain: null }) }, {}, DETECTOR],
    ],
  ])('for “%s” says that %s', (reason, detail, [part, filter, conditions]) => {
    expect(exclusionOf(part, filter, conditions)).toEqual({ reason, detail });
  });

  it.each<[string, Parameters<typeof exclusionOf>]>([
    ['a chosen lifecycle and approval', [{}, { lifecycle: ['active'], approval: ['approved'] }]],
    ['a package that contains the text, in any case', [{ package: 'SOIC-8' }, { package: ' soic ' }]],
    ['as many channels as are needed', [{}, { channels: 1 }]],
    ['a supply range that just covers the stage’s', [{}, { supply: { minimum: 5, maximum: 36 } }]],
    [
      'an unknown supply range',
      [
        { amplifier: amplifierWith({ supplyMinimum: null, supplyMaximum: null }) },
        { supply: { minimum: 1, maximum: 99 } },
      ],
    ],
    [
      'a minimum stable gain that the stage just has',
      [{ amplifier: amplifierWith({ minimumStableGain: 1 }) }],
    ],
    ['a bandwidth that is just enough', [{ amplifier: amplifierWith({ gainBandwidth: 60e3 }) }]],
    ['an unknown bandwidth', [{ amplifier: amplifierWith({ gainBandwidth: null }) }]],
  ])('isn’t made for %s', (_name, parameters) => {
    expect(exclusionOf(...parameters)).toBeNull();
  });

  it('states the first reason that applies', () => {
    const slow = amplifierWith({ gainBandwidth: 1e3, minimumStableGain: 10 });
    const filter: PartFilter = { lifecycle: ['active'], channels: 4 };
    expect(exclusionOf({ amplifier: slow, lifecycle: 'obsolete' }, filter)?.reason).toBe('lifecycle');
    expect(exclusionOf({ amplifier: slow }, filter)?.reason).toBe('too-few-channels');
    expect(exclusionOf({ amplifier: slow })?.reason).toBe('below-minimum-stable-gain');
  });

  it('isn’t made for a part that isn’t sought', () => {
    const obsolete: LibraryPart = {
      amplifier: amplifierWith(),
      lifecycle: 'obsolete',
      name: 'alder low noise',
    };
    const filter = (search: string): PartFilter => ({ search, lifecycle: ['active'] });
    expect(exclusionOf(obsolete, filter('noise ALDER'))?.reason).toBe('lifecycle');
    expect(exclusionOf(obsolete, filter('alder fast'))).toBeNull();
  });
});
