import { checkConditions } from '@roothertz/common/conditions';
import { describe, expect, it } from 'vitest';
import { exampleRequest } from './exampleRequest';
import { withValue } from './requestPath';
import { feedbackResistanceOf } from './schematic/feedbackResistanceOf';
import { STAGE_KINDS, stageKindOf, withStageKind } from './stageKind';

const pairs = STAGE_KINDS.flatMap((from) => STAGE_KINDS.map((to) => [from, to] as const));

describe('changing the stage', () => {
  it.each(pairs)('leads from %s to %s without an error', (from, to) => {
    const before = withValue(
      exampleRequest(from),
      'conditions.source.inductance',
      from === 'transimpedance' ? 0 : 0.1,
    );
    const after = withStageKind(before, to);
    expect(stageKindOf(after.conditions.stage)).toBe(to);
    expect(checkConditions(after)).toEqual([]);
  });

  it('keeps what the new stage has too', () => {
    const gain = withValue(exampleRequest('non-inverting'), 'conditions.stage.gain', 50);
    const both = withValue(gain, 'conditions.stage.loadResistance', 1e6);
    expect(withStageKind(both, 'inverting').conditions.stage).toEqual({
      topology: 'inverting',
      gain: 50,
      gainResistance: 10,
    });
    expect(withStageKind(both, 'instrumentation').conditions.stage).toEqual({
      topology: 'instrumentation',
      gain: 50,
      gainResistance: 10,
      loadResistance: 1e6,
    });
    expect(withStageKind(both, 'follower').conditions.stage).toMatchObject({ loadResistance: 1e6 });
  });
});

describe('an instrumentation stage', () => {
  it('amplifies where it comes from a follower', () => {
    const { stage } = withStageKind(exampleRequest('follower'), 'instrumentation').conditions;
    expect(stage.gain).toBe(100);
  });
});

describe('the feedback resistance', () => {
  it('follows from the gain', () => {
    expect(feedbackResistanceOf(exampleRequest('non-inverting').conditions)).toBe(990);
    expect(feedbackResistanceOf(exampleRequest('inverting').conditions)).toBe(20_000);
    expect(feedbackResistanceOf(exampleRequest('difference').conditions)).toBe(15_000);
    expect(feedbackResistanceOf(exampleRequest('instrumentation').conditions)).toBe(4950);
    expect(feedbackResistanceOf(exampleRequest('follower').conditions)).toBeNull();
    expect(feedbackResistanceOf(exampleRequest('transimpedance').conditions)).toBeNull();
  });
});
