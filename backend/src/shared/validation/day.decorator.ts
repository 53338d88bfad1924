import { isDay } from '@roothertz/common/prices';
import { Checked } from './checked.decorator.js';
import type { Presence } from './presence.js';

/** A day of the calendar such as `2026-12-31`. */
export function Day(label: string, presence?: Presence): PropertyDecorator {
  const message = `${label}: a day such as 2026-12-31 was expected`;
  return Checked((value) => (isDay(value) ? null : message), { format: 'date' }, presence);
}
