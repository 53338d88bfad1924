import { parallelStage, evaluateStage } from '@roothertz/common/noise';
import { renderHook } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import type { StageRequest, WholeStage } from '../../../api/stages';
import { EXAMPLE } from '../../../test/exampleRanking';
import { rankedStage, stageRankingOf } from '../../../test/stages';
import { stageKey } from './stageKey';
import { useSelectedStage } from './useSelectedStage';

const { gainResistance: _sought, ...stage } = EXAMPLE.conditions.stage;
const request: StageRequest = {
  conditions: {
    ...EXAMPLE.conditions,
    stage: {
      ...stage,
      gainTolerance: 0.01,
      network: { minimumTotal: 500, maximumTotal: 100e3 },
      parallelMaximum: 2,
      outputVoltage: 5,
    },
  },
  filter: {},
};

function withNoiseIndex<Stage extends WholeStage>(found: Stage, noiseIndex: number): Stage {
  const { gain, gainResistor, feedbackResistor } = found.network;
  const network = {
    gain,
    gainResistor: { ...gainResistor!, noiseIndex },
    feedbackResistor: { ...feedbackResistor!, noiseIndex },
  };
  return { ...found, network };
}

const first = withNoiseIndex(rankedStage(request, 1, 'VR-1108'), -10);
const second = withNoiseIndex({ ...rankedStage(request, 2, 'LQ-12'), channelsInParallel: 2 }, 0);
const onFrontier: WholeStage = { ...second, channelsInParallel: 1 };

function select(chosen: string | null) {
  const answer = stageRankingOf(request, [first, second], { frontier: [first, onFrontier] });
  const stages = { request, first: { ...answer, request }, items: [first, second] };
  return renderHook(() => useSelectedStage(stages, chosen)).result.current!;
}

describe('the stage that is looked at', () => {
  it('is the chosen one, that of the chosen part, or the first', () => {
    expect(select(null).stage).toBe(first);
    expect(select('2').stage).toBe(second);
    expect(select(stageKey(onFrontier)).stage).toBe(onFrontier);
    expect(select('2.8.1.1').stage).toBe(second);
    expect(select('99').stage).toBe(first);
  });

  it('has the excess noise of its resistors in its conditions, that of joined channels as theirs together', () => {
    const alone = select('1');
    expect(alone.single).toMatchObject({ gainNoiseIndex: -10, feedbackNoiseIndex: -10, outputVoltage: 5 });
    const excessOf = ({ request: { conditions }, selected }: typeof alone) =>
      evaluateStage(conditions, selected.part.amplifier).contributions.excess;
    expect(excessOf(alone)).toBeGreaterThan(0);
    const joined = select('2');
    const one = {
      conditions: { ...request.conditions, stage: joined.single },
      amplifier: second.part.amplifier,
    };
    const two = parallelStage(one, 2);
    expect(excessOf(joined)).toBeCloseTo(
      evaluateStage(two.conditions, two.amplifier).contributions.excess,
      15,
    );
    expect(excessOf(joined) / excessOf(alone)).toBeGreaterThan(2);
  });
});
