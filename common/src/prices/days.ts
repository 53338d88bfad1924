const MILLISECONDS_A_DAY = 86_400_000;
const DAY = /^\d{4}-\d{2}-\d{2}$/;

/** The day on which a moment lies in UTC, such as `2026-12-01`. */
export function dayOf(moment: Date): string {
  return moment.toISOString().slice(0, 10);
}

/**
 * The day a number of days after another; before it where the number is negative.
 *
 * @param day one that `isDay` accepts
 * @throws RangeError for a text that is no date
 * @example addDays('2026-12-31', 1) // '2027-01-01'
 */
export function addDays(day: string, days: number): string {
  return dayOf(new Date(Date.parse(day) + days * MILLISECONDS_A_DAY));
}

/** Whether a text is a day of the years 2000 to 2199, written as `2026-12-01`. */
export function isDay(text: unknown): text is string {
  if (typeof text !== 'string' || !DAY.test(text) || text < '2000' || text >= '2200') return false;
  const moment = new Date(`${text}T00:00:00Z`);
  return !Number.isNaN(moment.getTime()) && dayOf(moment) === text;
}
