import { OP_AMP_CATALOGUE } from '@roothertz/common/parts';
import { describe, expect, it } from 'vitest';
import { opAmp } from '../../test/factories';
import type { Figures } from '../../api/parts';
import { findConflicts, mergeDrafts } from './conflicts';
import { draftOf } from './partDraft';
import { withValueOf } from './partValues';

const base = draftOf(OP_AMP_CATALOGUE, opAmp());

function changed(values: Partial<typeof base>, figures: Figures = {}) {
  return { ...base, ...values, amplifier: { ...base.amplifier, ...figures } };
}

describe('an edit that others overtook', () => {
  it('finds what they changed, not what only I changed', () => {
    const conflicts = findConflicts(
      OP_AMP_CATALOGUE,
      base,
      changed({ package: 'DIP-8' }),
      changed({}, { currentNoise: null }),
    );
    expect(conflicts).toMatchObject([
      { path: ['amplifier', 'currentNoise'], before: '1.7 pA/√Hz', theirs: 'unknown', isMineToo: false },
    ]);
  });

  it('finds nothing to choose where both did the same', () => {
    const both = changed({ approval: 'restricted' });
    expect(findConflicts(OP_AMP_CATALOGUE, base, both, both)).toEqual([]);
  });

  it('keeps mine where both changed, and theirs where only they did, unless chosen otherwise', () => {
    const mine = changed({ package: 'DIP-8' }, { gainBandwidth: 60e6 });
    const theirs = changed({ approval: 'restricted' }, { gainBandwidth: 55e6 });
    const conflicts = findConflicts(OP_AMP_CATALOGUE, base, mine, theirs);
    expect(mergeDrafts(mine, theirs, conflicts, {})).toEqual(
      changed({ package: 'DIP-8', approval: 'restricted' }, { gainBandwidth: 60e6 }),
    );
    const choices = { 'amplifier.gainBandwidth': 'theirs', approval: 'mine' } as const;
    expect(mergeDrafts(mine, theirs, conflicts, choices)).toEqual(
      changed({ package: 'DIP-8' }, { gainBandwidth: 55e6 }),
    );
  });

  it('reads an origin that nobody stated as typical', () => {
    const theirs = withValueOf(base, ['origins', 'currentNoise'], {
      ...base,
      origins: { currentNoise: 'typical' },
    });
    expect(findConflicts(OP_AMP_CATALOGUE, base, base, theirs)).toEqual([]);
  });
});
