import type { WholeStage } from '../../../api/stages';

/** Names one of the stages of an op-amp: the part's id, then channels and resistors. */
export function stageKey({ part, channelsInParallel, network }: WholeStage): string {
  const { gainResistor, feedbackResistor } = network;
  return [part.id, channelsInParallel, gainResistor?.id ?? '', feedbackResistor?.id ?? ''].join('.');
}
