import { RETIRED } from '@roothertz/common/parts';
import { describe, expect, it } from 'vitest';
import { opAmp } from '../../../test/factories';
import { changesBack, changesOf, doneWords, planStanding, planWords } from './standingPlan';

const PARTS = [
  opAmp({ id: '1', partNumber: 'VR-1', version: 3 }),
  opAmp({ id: '2', lifecycle: 'obsolete', approval: 'restricted', version: 5 }),
  opAmp({ id: '3', library: 'curated' }),
];

describe('what becomes of chosen parts', () => {
  it('is said before it is done, with what stays and why', () => {
    expect(planWords(planStanding(PARTS, { lifecycle: 'obsolete' }))).toBe(
      'Sets 1 of 3 parts to obsolete; 1 is so already, 1 curated one can’t be changed.',
    );
    expect(planWords(planStanding(PARTS.slice(0, 2), { approval: 'not-approved' }))).toBe(
      'Sets 2 parts to not approved.',
    );
    expect(planWords(planStanding(PARTS, RETIRED))).toBe(
      'Retires 2 of 3 parts: obsolete and not approved; 1 curated one can’t be changed.',
    );
  });

  it('is said after it is done', () => {
    expect(doneWords(planStanding(PARTS, { lifecycle: 'obsolete' }))).toBe('VR-1 is set to obsolete');
    expect(doneWords(planStanding(PARTS, RETIRED))).toBe('2 parts are retired');
  });

  it('names only the parts that change, and brings each back to how it stood', () => {
    const plan = planStanding(PARTS, RETIRED);
    expect(changesOf(plan)).toEqual([
      { id: '1', version: 3, ...RETIRED },
      { id: '2', version: 5, ...RETIRED },
    ]);
    const since = [
      { id: '1', version: 4 },
      { id: '2', version: 6 },
    ];
    expect(changesBack(plan, since)).toEqual([
      { id: '1', version: 4, lifecycle: 'active', approval: 'approved' },
      { id: '2', version: 6, lifecycle: 'obsolete', approval: 'restricted' },
    ]);
  });
});
