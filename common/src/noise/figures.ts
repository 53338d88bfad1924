import type { Caution } from './cautions.js';
import type { Contributions, Contributor } from './contributors.js';

/** The source's own noise, referred to the source: the limit that no amplifier can pass. */
export interface SourceFloor {
  /** V/√Hz (A/√Hz in a transimpedance stage), at the reference frequency */
  inputNoiseDensity: number;
  /** V (A in a transimpedance stage), over the band */
  inputNoiseRms: number;
}

/** The figures of one stage with one amplifier; in a transimpedance stage input figures are in A and A/√Hz. */
export interface StageFigures extends SourceFloor {
  /** V */
  outputNoiseRms: number;
  /** V/V (V/A in a transimpedance stage), at the reference frequency */
  signalGain: number;
  /** Hz; null where the gain–bandwidth product is unknown */
  closedLoopBandwidth: number | null;
  /** dB, at the reference frequency; null where the source makes no noise */
  noiseFigure: number | null;
  /** dB, over the band; null where the source makes no noise */
  aboveFloor: number | null;
  contributions: Contributions;
  /** The contributor with the largest share. */
  dominant: Contributor;
  cautions: Caution[];
}
