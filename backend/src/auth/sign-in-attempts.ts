import { Injectable } from '@nestjs/common';

const FREE_FAILURES = 5;
const FIRST_WAIT_SECONDS = 5;
const LONGEST_WAIT_SECONDS = 900;
const MOST_KEYS = 10_000;

interface Failures {
  count: number;
  /** Milliseconds of the clock until which no further attempt is heard. */
  until: number;
}

/**
 * Slows the guessing of passwords: past five failures of one account from one address each further
 * one doubles the wait, up to a quarter of an hour. Kept in memory, the oldest dropped past a limit.
 */
@Injectable()
export class SignInAttempts {
  private readonly failures = new Map<string, Failures>();

  /** Seconds until the next attempt is heard; 0 = now. */
  waitSeconds(key: string, now = Date.now()): number {
    const { until } = this.failures.get(key) ?? { until: 0 };
    return Math.max(0, Math.ceil((until - now) / 1000));
  }

  recordFailure(key: string, now = Date.now()): void {
    const count = (this.recent(key, now)?.count ?? 0) + 1;
    this.failures.delete(key);
    this.failures.set(key, { count, until: now + 1000 * waitAfter(count) });
    if (this.failures.size > MOST_KEYS) this.failures.delete(this.failures.keys().next().value ?? '');
  }

  recordSuccess(key: string): void {
    this.failures.delete(key);
  }

  private recent(key: string, now: number): Failures | undefined {
    const failures = this.failures.get(key);
    return failures && now - failures.until < 1000 * LONGEST_WAIT_SECONDS ? failures : undefined;
  }
}

function waitAfter(failures: number): number {
  if (failures < FREE_FAILURES) return 0;
  return Math.min(FIRST_WAIT_SECONDS * 2 ** (failures - FREE_FAILURES), LONGEST_WAIT_SECONDS);
}
