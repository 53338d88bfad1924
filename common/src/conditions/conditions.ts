import type { Approval, InputType, Library, Lifecycle } from '../parts/index.js';

export const TOPOLOGIES = [
  'non-inverting',
  'inverting',
  'transimpedance',
  'difference',
  'instrumentation',
] as const;
export type Topology = (typeof TOPOLOGIES)[number];

/** How an amplifier's figures, given at 25 °C, are carried to the ambient temperature. */
export const AMPLIFIER_TEMPERATURE_MODELS = ['estimated', 'none'] as const;
export type AmplifierTemperatureModel = (typeof AMPLIFIER_TEMPERATURE_MODELS)[number];

/**
 * The signal source: (R + jωL) ∥ 1/jωC, or in a transimpedance stage a current source ∥ R ∥ C. A difference or
 * instrumentation stage takes it as two equal legs about ground, each half of the EMF behind R/2 + jωL/2 with 2C.
 */
export interface SourceConditions {
  /** Ω */
  resistance: number;
  /** H */
  inductance: number;
  /** F */
  capacitance: number;
  /** K; left out = the ambient temperature */
  temperature?: number;
  /** A, transimpedance only: a detector's direct current, whose shot noise belongs to the source */
  directCurrent?: number;
}

export interface BandConditions {
  /** Hz */
  lower: number;
  /** Hz; the −3 dB frequency where there is a low-pass */
  upper: number;
  /** 0 = brick wall, n = Butterworth low-pass of n-th order */
  lowPassOrder: number;
}

export interface StageConditions {
  topology: Topology;
  /** V/V, magnitude; not in a transimpedance stage */
  gain?: number;
  /** Ω, R_g, in each leg of a difference stage; left out at gain 1 = followers without a network */
  gainResistance?: number;
  /** Ω, from each + input of the source to ground; left out = none */
  loadResistance?: number;
  /** Ω, each of the four resistors behind the input pair of an instrumentation stage; left out = 10 kΩ */
  differenceResistance?: number;
  /** Ω, from the + input to ground in an inverting stage; 0 = none */
  biasResistance?: number;
  /** Ω, R_f of a transimpedance stage */
  feedbackResistance?: number;
  /** F, C_f of a transimpedance stage; "auto" = maximally flat for each amplifier */
  feedbackCapacitance?: number | 'auto';
  /** V, direct voltage at the output, which drives the network's excess noise; left out = none */
  outputVoltage?: number;
  /** dB, noise index of R_g; left out = no excess noise */
  gainNoiseIndex?: number;
  /** dB, noise index of R_f; left out = no excess noise */
  feedbackNoiseIndex?: number;
  /** Limits of the feedback network; below `minimumTotal` (Ω) it loads the output too much. */
  network?: { minimumTotal: number };
}

/** Ω, of the four resistors of an instrumentation stage where nothing else is stated (common practice, no source). */
export const USUAL_DIFFERENCE_RESISTANCE = 10e3;

/** Everything that the noise of a stage depends on besides the amplifier. */
export interface OperatingConditions {
  source: SourceConditions;
  /** K */
  ambientTemperature: number;
  band: BandConditions;
  stage: StageConditions;
  /** Hz */
  referenceFrequency: number;
  /** closed-loop bandwidth over the band's upper end, below which a part is too slow; 0 excludes none */
  bandwidthMargin: number;
  amplifierTemperatureModel: AmplifierTemperatureModel;
}

/** Which parts are considered at all, and which of them are excluded with a reason. */
export interface PartFilter {
  search?: string;
  library?: Library[];
  lifecycle?: Lifecycle[];
  approval?: Approval[];
  inputType?: InputType[];
  /** channels that the package has at least */
  channels?: number;
  /** text that the package's name contains */
  package?: string;
  /** V, total supply voltage: the part must work over the whole range */
  supply?: { minimum: number; maximum: number };
}

export interface RankingTarget {
  /** V, or A in a transimpedance stage */
  inputNoiseRms?: number;
}

/** What a saved set of named conditions holds, and what the page's address holds. */
export interface RankingRequest {
  conditions: OperatingConditions;
  filter?: PartFilter;
  target?: RankingTarget;
  quantity?: number;
}
