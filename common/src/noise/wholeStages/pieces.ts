import type { Topology } from '../../conditions/index.js';

/** How many pieces of each found resistor a stage takes. */
export interface NetworkPieces {
  gain: number;
  feedback: number;
}

const PIECES: Record<Topology, NetworkPieces> = {
  'non-inverting': { gain: 1, feedback: 1 },
  inverting: { gain: 1, feedback: 1 },
  transimpedance: { gain: 0, feedback: 1 },
  difference: { gain: 2, feedback: 2 },
  instrumentation: { gain: 1, feedback: 2 },
};

/**
 * The pieces of R_g and R_f in one stage; each of several channels in parallel has a network of its own.
 * The four difference resistors of an instrumentation stage aren't sought, and so not counted.
 */
export function networkPieces(topology: Topology, channelsInParallel: number): NetworkPieces {
  const { gain, feedback } = PIECES[topology];
  return { gain: gain * channelsInParallel, feedback: feedback * channelsInParallel };
}

const INSTRUMENTATION_CHANNELS = 3;

/** The packages of an op-amp in one stage: channels in parallel are those of one package. */
export function opAmpPieces(topology: Topology, channels: number): number {
  return topology === 'instrumentation' ? Math.ceil(INSTRUMENTATION_CHANNELS / channels) : 1;
}
