import { addDays, dayOf } from '@roothertz/common/prices';

const HOUR_MS = 3_600_000;
/** Of Monday, in UTC: from then on the week's digest is due. */
const DUE_HOUR = 7;

/** The Monday of the digest that is due at a moment: `2026-11-30` from that day 07:00 UTC until a week later. */
export function digestWeek(moment: Date): string {
  const shifted = new Date(moment.getTime() - DUE_HOUR * HOUR_MS);
  const daysSinceMonday = (shifted.getUTCDay() + 6) % 7;
  return addDays(dayOf(shifted), -daysSinceMonday);
}
