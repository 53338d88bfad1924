const DAY = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' });

/** The day of a moment in UTC as a letter writes it: `20 December 2026`. */
export function dayText(moment: Date): string {
  return DAY.format(moment);
}
