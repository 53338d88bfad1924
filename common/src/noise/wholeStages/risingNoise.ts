import type { BandConditions } from '../../conditions/index.js';
import type { Block } from './blocks.js';
import type { Network, SoughtConditions } from './stageSearch.js';

/** What places an amplifier's loop: gain–bandwidth product in Hz (Infinity = ideal) and input capacitance in F. */
export interface LoopAmplifier {
  gainBandwidth: number;
  inputCapacitance: number;
}

/**
 * How far the noise of a block's networks may lie below that at its least gain resistance and the same gain,
 * as a factor up to 1; 0 = nothing is known of it.
 *
 * At one gain every resistance of the network, and what current noise and input capacitance make of it, rises
 * with the gain resistance. Only the input capacitance at R_f counts against it: with Ω = 2π·GBW it bends the
 * loop, 1/|1 + s·N/Ω + s²·C_in·R_f/Ω|², so that the signal at the reference frequency gains a little, and beyond
 * the bend, f² = GBW/(2π·C_in·R_f), white noise of the band's low-pass is lost. An input network that
 * depends on frequency has no such law in stages where the source drives the network.
 */
export function risingShare(sought: SoughtConditions, block: Block): (amplifier: LoopAmplifier) => number {
  const { topology } = sought.stage;
  if (topology === 'non-inverting') return () => 1;
  if (topology === 'transimpedance' || drivesReactive(sought)) return () => 0;
  const least = feedbackOf(sought, block.least[0]);
  const most = feedbackOf(sought, block.most[1]);
  const { gain } = block.least[0];
  const shapes = topology === 'instrumentation';
  return ({ gainBandwidth, inputCapacitance }) => {
    const bend = (feedback: number) => (2 * Math.PI * inputCapacitance * feedback) / gainBandwidth;
    const loop = {
      least: bend(least),
      most: bend(most),
      slowness: (gain + (shapes ? 0 : 1)) / gainBandwidth,
    };
    const share = keptSignal(sought, loop) * keptNoise(sought.band, loop);
    return share === 0 || !shapes
      ? share
      : share * keptPair(sought, inputCapacitance * least, inputCapacitance * most, gain);
  };
}

function drivesReactive({ source, stage: { topology } }: SoughtConditions): boolean {
  const isDriven = topology === 'inverting' || topology === 'difference';
  return isDriven && (source.inductance > 0 || source.capacitance > 0);
}

/** Ω, R_f of a network. */
function feedbackOf({ source, stage }: SoughtConditions, { gain, gainResistance }: Network): number {
  switch (stage.topology) {
    case 'instrumentation':
      return (gainResistance * (gain - 1)) / 2;
    case 'difference':
      return gain * (gainResistance + source.resistance / 2);
    default:
      return gain * (gainResistance + source.resistance);
  }
}

/** |1 + s·N/Ω + s²·C_in·R_f/Ω|² at f is (1 − bend·f²)² + (slowness·f)². */
interface Loop {
  /** s², at the least and the largest R_f */
  least: number;
  most: number;
  /** s, N/GBW */
  slowness: number;
}

/** The signal's gain at the reference frequency at the least R_f over that at the largest. */
function keptSignal({ referenceFrequency }: SoughtConditions, { least, most, slowness }: Loop): number {
  const square = referenceFrequency ** 2;
  if (most * square >= 1) return 0;
  const at = (bend: number) => (1 - bend * square) ** 2 + slowness ** 2 * square;
  return Math.sqrt(at(most) / at(least));
}

/**
 * What of the noise beyond the bend can't be lost: all where the band ends before it. A first-order low-pass leaves
 * too much of a resonance at the bend to say.
 */
function keptNoise({ upper, lowPassOrder }: BandConditions, { least, most, slowness }: Loop): number {
  const nearness = Math.sqrt(most) * upper;
  if (nearness > 1) return 0;
  if (lowPassOrder === 0 || most === 0) return 1;
  const decay = 2 * lowPassOrder - 1;
  const peak = Math.max(1, most / slowness ** 2);
  if (decay === 1 && peak > 1) return 0;
  const beyond = Math.min(1, (peak * nearness ** decay) / decay);
  return Math.sqrt(1 - beyond * (1 - (least / most) ** 2));
}

/** As `keptSignal` for N = gain + s·C_in·R_f of an input pair, by which its signal is amplified too. */
function keptPair(
  { referenceFrequency }: SoughtConditions,
  least: number,
  most: number,
  gain: number,
): number {
  const at = (delay: number) => 1 + (2 * Math.PI * referenceFrequency * (delay / gain)) ** 2;
  return Math.sqrt(at(least) / at(most));
}
