/** Why two parts may be one and the same. */
export const DUPLICATE_REASONS = [
  'same-part',
  'same-number',
  'look-alike',
  'suffix',
  'same-figures',
] as const;
export type DuplicateReason = (typeof DUPLICATE_REASONS)[number];

export const DUPLICATE_LABELS: Record<DuplicateReason, string> = {
  'same-part': 'same part in both libraries',
  'same-number': 'same part number, makers of similar names',
  'look-alike': 'part numbers that read alike',
  suffix: 'part numbers that differ in package or reel only',
  'same-figures': 'all figures equal',
};

/** How likely each reason alone makes it that two parts are one (our judgement, no source). */
export const DUPLICATE_LIKELIHOODS: Record<DuplicateReason, number> = {
  'same-part': 0.99,
  'same-number': 0.9,
  'look-alike': 0.85,
  suffix: 0.6,
  'same-figures': 0.5,
};

/** The likelihood in words. */
export function likelihoodWords(likelihood: number): string {
  if (likelihood >= 0.9) return 'very likely';
  return likelihood >= 0.7 ? 'likely' : 'possible';
}
