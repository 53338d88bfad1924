/** What makes a figure less certain than it looks. */
export const CAUTIONS = [
  'current-noise-unknown',
  'corner-unknown',
  'bandwidth-unknown',
  'capacitance-unknown',
  'estimated-at-temperature',
  'feedback-network-loads-output',
  'stability-unknown',
  'supply-unknown',
  'several-packages',
] as const;
export type Caution = (typeof CAUTIONS)[number];

/** Two or three words for a row of the grid. */
export const CAUTION_LABELS: Record<Caution, string> = {
  'current-noise-unknown': 'i_n unknown',
  'corner-unknown': '1/f corner unknown',
  'bandwidth-unknown': 'bandwidth unknown',
  'capacitance-unknown': 'C_in unknown',
  'estimated-at-temperature': 'estimated at temperature',
  'feedback-network-loads-output': 'network loads the output',
  'stability-unknown': 'stability unknown',
  'supply-unknown': 'supply unknown',
  'several-packages': 'several packages',
};

/** One sentence that says what the caution means for the figure. */
export const CAUTION_DETAILS: Record<Caution, string> = {
  'current-noise-unknown':
    'The current noise is unknown: a lower bound stands in for it, so the total is at least what is shown.',
  'corner-unknown': 'A 1/f corner is unknown and counts as 0 Hz: below some hertz the noise may be higher.',
  'bandwidth-unknown': 'The gain–bandwidth product is unknown: the amplifier counts as ideally fast.',
  'capacitance-unknown': 'The input capacitance is unknown and counts as none.',
  'estimated-at-temperature':
    'The amplifier’s noise is carried from 25 °C to the ambient temperature by a rule of thumb.',
  'feedback-network-loads-output': 'The feedback network is less than what the output is to drive.',
  'stability-unknown': 'The minimum stable gain is unknown: check it against the stage’s noise gain.',
  'supply-unknown': 'The supply range is unknown: check it against the supply of the stage.',
  'several-packages':
    'An instrumentation stage takes three channels of the same op-amp: more than one package of this part.',
};

/** Why a part is left out of a ranking; the first that applies is stated. */
export const EXCLUSION_REASONS = [
  'lifecycle',
  'approval',
  'retired',
  'input-type',
  'package',
  'too-few-channels',
  'supply-out-of-range',
  'below-minimum-stable-gain',
  'too-slow',
  'noise-unbounded',
] as const;
export type ExclusionReason = (typeof EXCLUSION_REASONS)[number];

export const EXCLUSION_LABELS: Record<ExclusionReason, string> = {
  lifecycle: 'lifecycle not chosen',
  approval: 'approval not chosen',
  retired: 'retired',
  'input-type': 'input type not chosen',
  package: 'other package',
  'too-few-channels': 'too few channels',
  'supply-out-of-range': 'supply out of range',
  'below-minimum-stable-gain': 'unstable at this gain',
  'too-slow': 'too slow for the band',
  'noise-unbounded': 'noise doesn’t end with the band',
};
