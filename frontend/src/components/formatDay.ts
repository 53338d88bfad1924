const DAY = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeZone: 'UTC' });

/** The day of a moment in UTC, such as "1 Dec 2026". */
export function formatDay(moment: string): string {
  return DAY.format(new Date(moment));
}
