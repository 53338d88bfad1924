import { setTimeout as delay } from 'node:timers/promises';

/** Answers no sooner than after so many milliseconds, so that the time doesn't tell what was done. */
export async function takingAtLeast(milliseconds: number, work: Promise<void>): Promise<void> {
  await Promise.all([work, delay(milliseconds)]);
}
