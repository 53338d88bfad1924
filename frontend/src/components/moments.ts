const MOMENT = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'short' });

/** A time as a person writes it: day and minute. */
export function moment(time: string): string {
  return MOMENT.format(new Date(time));
}
