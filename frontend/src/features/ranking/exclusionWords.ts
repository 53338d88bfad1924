import { EXCLUSION_LABELS, type ExclusionReason } from '@roothertz/common/noise';
import type { Ranking } from '../../api/ranking';

type Excluded = Ranking['excluded'];

/** "41 parts left out" */
export function leftOutText({ total }: Excluded): string {
  return total === 1 ? '1 part left out' : `${total} parts left out`;
}

/** "22 supply out of range, 11 too slow for the band", the most frequent first. */
export function reasonsText({ reasons }: Excluded): string {
  return byCount(reasons)
    .map(({ reason, count }) => `${count} ${EXCLUSION_LABELS[reason]}`)
    .join(', ');
}

/** What to change where nothing is ranked. */
export function emptyAdvice({ total, reasons }: Excluded, search: string | undefined): string {
  const [most] = byCount(reasons);
  if (most === undefined)
    return search
      ? `No part contains “${search}”. Change or clear the search.`
      : 'The chosen libraries hold no op-amps. Choose both libraries, or add parts.';
  const all = total === 1 ? 'The only part is' : `All ${total} parts are`;
  return `${all} left out. ${most.count} of them: ${EXCLUSION_LABELS[most.reason]}. ${ADVICE[most.reason]}`;
}

function byCount(reasons: Excluded['reasons']): Excluded['reasons'] {
  return [...reasons].sort((one, other) => other.count - one.count);
}

const ADVICE: Record<ExclusionReason, string> = {
  lifecycle: 'Tick more lifecycles under Parts.',
  approval: 'Tick more approvals under Parts.',
  'input-type': 'Tick more input types under Parts.',
  package: 'Change or clear the package under Parts.',
  'too-few-channels': 'Lower the channels.',
  'supply-out-of-range': 'Narrow the supply range.',
  'below-minimum-stable-gain': 'Raise the gain.',
  'too-slow': 'Lower the bandwidth margin, the gain or the upper end of the band.',
  'noise-unbounded': 'Choose a low-pass of second order.',
};
