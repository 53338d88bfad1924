import { USUAL_DIFFERENCE_RESISTANCE, type Topology } from '../../conditions/index.js';
import type { SoughtStage } from './stageSearch.js';

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

/** The pieces of R_g and R_f in one stage; each of several channels in parallel has a network of its own. */
export function networkPieces(topology: Topology, channelsInParallel: number): NetworkPieces {
  const { gain, feedback } = PIECES[topology];
  return { gain: gain * channelsInParallel, feedback: feedback * channelsInParallel };
}

const INSTRUMENTATION_CHANNELS = 3;

/** The packages of an op-amp in one stage: channels in parallel are those of one package. */
export function opAmpPieces(topology: Topology, channels: number): number {
  return topology === 'instrumentation' ? Math.ceil(INSTRUMENTATION_CHANNELS / channels) : 1;
}

/** Parts of a stage that no search chooses: the asker states them, or they follow from the others. */
export const UNSOUGHT_PLACES = ['load', 'bias', 'difference', 'feedback-capacitor', 'averaging'] as const;
export type UnsoughtPlace = (typeof UNSOUGHT_PLACES)[number];

/** Equal parts of one stage that aren't sought, and so aren't in its price. */
export interface UnsoughtPieces {
  place: UnsoughtPlace;
  pieces: number;
  /** Ω, of the capacitor F; null = not stated */
  value: number | null;
}

/**
 * What a stage takes besides its op-amps, R_g and R_f: resistors from the + inputs to ground, the four resistors
 * behind the input pair of an instrumentation stage, C_f of a transimpedance stage, and one resistor from each
 * channel in parallel, which average their outputs.
 */
export function unsoughtPieces(stage: SoughtStage, channelsInParallel: number): UnsoughtPieces[] {
  const { topology, loadResistance = null, biasResistance, feedbackCapacitance } = stage;
  const isInstrumentation = topology === 'instrumentation';
  const capacitance = feedbackCapacitance === 'auto' ? null : feedbackCapacitance;
  const all: (UnsoughtPieces & { isThere: boolean })[] = [
    {
      place: 'load',
      pieces: isInstrumentation ? 2 : 1,
      value: loadResistance,
      isThere: loadResistance !== null,
    },
    { place: 'bias', pieces: 1, value: biasResistance ?? null, isThere: Boolean(biasResistance) },
    {
      place: 'difference',
      pieces: 4,
      value: stage.differenceResistance ?? USUAL_DIFFERENCE_RESISTANCE,
      isThere: isInstrumentation,
    },
    {
      place: 'feedback-capacitor',
      pieces: 1,
      value: capacitance ?? null,
      isThere: capacitance === null || Boolean(capacitance),
    },
    { place: 'averaging', pieces: channelsInParallel, value: null, isThere: channelsInParallel > 1 },
  ];
  return all.filter(({ isThere }) => isThere).map(({ isThere: _isThere, ...pieces }) => pieces);
}
