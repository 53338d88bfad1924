/** The contributors of a stage's noise budget, in the order in which they are drawn and listed. */
export const CONTRIBUTORS = [
  'source',
  'amplifierVoltage',
  'amplifierCurrentSource',
  'amplifierCurrentFeedback',
  'feedback',
  'bias',
  'excess',
] as const;
export type Contributor = (typeof CONTRIBUTORS)[number];

/** RMS (V or A) or density (V/√Hz or A/√Hz) of each contributor, referred to the source; their squares add up. */
export type Contributions = Record<Contributor, number>;

export const CONTRIBUTOR_LABELS: Record<Contributor, string> = {
  source: 'source',
  amplifierVoltage: 'amplifier voltage noise',
  amplifierCurrentSource: 'amplifier current noise in the source',
  amplifierCurrentFeedback: 'amplifier current noise in the feedback network',
  feedback: 'feedback network',
  bias: 'bias and load resistors',
  excess: 'resistor excess noise',
};
