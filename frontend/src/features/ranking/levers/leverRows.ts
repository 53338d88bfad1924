import type { RankingRequest } from '@roothertz/common/conditions';
import { findLevers, type Lever, type LeverKey } from '@roothertz/common/noise';
import type { PlottedPart } from '../comparedPart';

/** What a click on a lever does. */
export type LeverAct =
  { kind: 'try'; request: RankingRequest } | { kind: 'select'; partId: string } | { kind: 'none' };

export interface LeverRow {
  key: LeverKey;
  label: string;
  /** "−2.9 dB" */
  change: string;
  helps: boolean;
  sentence: string;
  act: LeverAct;
}

/** Levers that are a change of the operating conditions; the others need another circuit or part. */
const CONDITION_LEVERS: readonly LeverKey[] = [
  'cool-source',
  'cool-circuit',
  'halve-band',
  'lower-network',
  'raise-feedback',
  'lower-voltage',
];

/** Less than this can't be told on a bench, dB. */
const NOTICEABLE = 0.05;

/** The levers of a part as rows, those that help most first. */
export function leverRows(
  request: RankingRequest,
  part: PlottedPart,
  quieter: PlottedPart | undefined,
): LeverRow[] {
  const levers = findLevers(request.conditions, leverPart(part), quieter && leverPart(quieter));
  return levers.map((lever) => ({
    key: lever.key,
    label: lever.label,
    change: changeText(lever.change),
    helps: lever.change <= -NOTICEABLE,
    sentence: lever.sentence,
    act: actOf(lever, request, quieter),
  }));
}

/** The part just above another in a ranking; none above the first or where the part isn't ranked. */
export function nextQuieter<Part extends { id: string }>(
  partId: string,
  ranked: readonly { part: Part }[],
): Part | undefined {
  return ranked[ranked.findIndex(({ part }) => part.id === partId) - 1]?.part;
}

function leverPart({ amplifier, partNumber }: PlottedPart) {
  return { amplifier, name: partNumber };
}

function actOf(
  { key, conditions }: Lever,
  request: RankingRequest,
  quieter: PlottedPart | undefined,
): LeverAct {
  if (CONDITION_LEVERS.includes(key)) return { kind: 'try', request: { ...request, conditions } };
  return key === 'quieter-part' && quieter ? { kind: 'select', partId: quieter.id } : { kind: 'none' };
}

/** A change in dB with its sign, one decimal; a change that rounds to nothing has none. */
export function changeText(change: number): string {
  const rounded = Math.round(change * 10) / 10;
  const sign = rounded < 0 ? '−' : rounded > 0 ? '+' : '';
  return `${sign}${Math.abs(rounded).toFixed(1)}\u2009dB`;
}

/** "−1.2 dB", what a perfect amplifier would change. */
export function atBestText(leftToGain: number): string {
  return Number.isFinite(leftToGain) ? changeText(-leftToGain) : '–';
}
