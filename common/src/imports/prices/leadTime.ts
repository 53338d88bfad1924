import { boundsError, type Reading } from '../../parts/index.js';
import { OFFER_FIELDS } from '../../prices/index.js';

/** In which lists state how long a delivery takes. */
export const TIME_UNITS = ['days', 'weeks'] as const;
export type TimeUnit = (typeof TIME_UNITS)[number];

const DAYS_IN: Record<TimeUnit, number> = { days: 1, weeks: 7 };
const WORDS: Record<TimeUnit, RegExp> = {
  days: /^(?:d|days?|tage?n?|jours?|j)\.?$/iu,
  weeks: /^(?:w|wks?|weeks?|wochen?|wo|semaines?|sem)\.?$/iu,
};

/** The unit of time that a word means, or null. */
export function timeUnitOf(word: string): TimeUnit | null {
  return TIME_UNITS.find((unit) => WORDS[unit].test(word.trim())) ?? null;
}

/**
 * Reads a lead time as days: a whole number, with its unit or in that of the column.
 *
 * @example readLeadTime('6 Wochen', 'days') → 42
 */
export function readLeadTime(cell: string, unit: TimeUnit): Reading<number> {
  const { label } = OFFER_FIELDS.leadTimeDays;
  const match = /^(\d{1,5})\s*(\p{L}+\.?)?$/u.exec(cell.trim());
  const own = match?.[2] === undefined ? unit : timeUnitOf(match[2]);
  if (match === null || own === null)
    return { ok: false, message: `${label}: a whole number of days or weeks was expected` };
  const value = Number(match[1]) * DAYS_IN[own];
  const message = boundsError(OFFER_FIELDS.leadTimeDays, value);
  return message === null ? { ok: true, value } : { ok: false, message };
}
