import {
  EXCLUSION_LABELS,
  RESISTOR_EXCLUSION_LABELS,
  type ExclusionReason,
  type ResistorExclusionReason,
} from '@roothertz/common/noise';

/** How many parts a ranking leaves out, by reason. */
export interface Excluded<Reason extends string = string> {
  total: number;
  reasons: readonly { reason: Reason; count: number }[];
}

/** "41 parts left out" */
export function leftOutText({ total }: Excluded): string {
  return total === 1 ? '1 part left out' : `${total} parts left out`;
}

/** "22 supply out of range, 11 too slow for the band", the most frequent first. */
export function reasonsText(
  { reasons }: Excluded,
  labels: Record<string, string> = EXCLUSION_LABELS,
): string {
  return byCount(reasons)
    .map(({ reason, count }) => `${count} ${labels[reason]}`)
    .join(', ');
}

/** What to change where nothing is ranked. */
export function emptyAdvice(excluded: Excluded<ExclusionReason>, search: string | undefined): string {
  if (excluded.reasons.length > 0) return allLeftOut(excluded, EXCLUSION_LABELS, ADVICE);
  return search
    ? `No part contains “${search}”. Change or clear the search.`
    : 'The chosen libraries hold no op-amps. Choose both libraries, or add parts.';
}

/** What to change where no resistor within the window is ranked. */
export function emptyResistorAdvice(excluded: Excluded<ResistorExclusionReason>): string {
  return allLeftOut(excluded, RESISTOR_EXCLUSION_LABELS, RESISTOR_ADVICE);
}

function allLeftOut<Reason extends string>(
  { total, reasons }: Excluded<Reason>,
  labels: Record<Reason, string>,
  advice: Record<Reason, string>,
): string {
  const [most] = byCount(reasons);
  const all = total === 1 ? 'The only part is' : `All ${total} parts are`;
  return `${all} left out. ${most.count} of them: ${labels[most.reason]}. ${advice[most.reason]}`;
}

function byCount<Reason extends string>(reasons: Excluded<Reason>['reasons']) {
  return [...reasons].sort((one, other) => other.count - one.count);
}

const ADVICE: Record<ExclusionReason, string> = {
  lifecycle: 'Tick more lifecycles under Parts.',
  approval: 'Tick more approvals under Parts.',
  retired: 'Tick “obsolete” or “not approved” under Parts.',
  'input-type': 'Tick more input types under Parts.',
  package: 'Change or clear the package under Parts.',
  'too-few-channels': 'Lower the channels.',
  'supply-out-of-range': 'Narrow the supply range.',
  'below-minimum-stable-gain': 'Raise the gain.',
  'too-slow': 'Lower the bandwidth margin, the gain or the upper end of the band.',
  'noise-unbounded': 'Choose a low-pass of second order.',
};

const RESISTOR_ADVICE: Record<ResistorExclusionReason, string> = {
  lifecycle: ADVICE.lifecycle,
  approval: ADVICE.approval,
  retired: ADVICE.retired,
  technology: 'Choose more technologies.',
  tolerance: 'Allow wider tolerances.',
  package: 'Change or clear the package.',
  'over-rating': 'Lower the direct voltage, or share it among several resistors in series.',
};
