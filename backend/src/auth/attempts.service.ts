import { createHash } from 'node:crypto';
import { Injectable, Logger } from '@nestjs/common';
import { Interval } from '@nestjs/schedule';
import { InjectDataSource } from '@nestjs/typeorm';
import { type DataSource, type EntityManager, In, LessThan, MoreThan } from 'typeorm';
import { DomainError } from '../shared/errors/domain-error.js';
import { logFailure } from '../shared/errors/log-failure.js';
import { type AttemptSubject, waitAfter } from './attempt-limits.js';
import { AttemptCount } from './entities/attempt-count.entity.js';

const FORGOTTEN_AFTER_MS = 3_600_000;

/** Counts attempts in the database, so that all processes of the API slow them together. */
@Injectable()
export class Attempts {
  private readonly logger = new Logger(Attempts.name);

  constructor(@InjectDataSource() private readonly dataSource: DataSource) {}

  /**
   * Counts an attempt before its outcome is known, so that many at once gain nothing.
   *
   * @throws `request.too-many` with the seconds to wait where one of the subjects has to; nothing is counted then
   */
  async count(subjects: readonly AttemptSubject[]): Promise<void> {
    for (const subject of subjects) await this.makeRow(hashOf(subject));
    const now = new Date();
    await this.dataSource.transaction('READ COMMITTED', async (manager) => {
      for (const subject of subjects) await countOne(manager, subject, now);
    });
  }

  /** Takes back the attempt that was counted, for it was right; of the account nothing is held against it any more. */
  async succeed(subjects: readonly AttemptSubject[]): Promise<void> {
    const { manager } = this.dataSource;
    const [cleared, kept] = [true, false].map((clears) =>
      subjects.filter(({ limit }) => limit.clearedBySuccess === clears).map(hashOf),
    );
    await manager.delete(AttemptCount, { hash: In(cleared) });
    await manager.decrement(AttemptCount, { hash: In(kept), count: MoreThan(0) }, 'count', 1);
  }

  @Interval(FORGOTTEN_AFTER_MS)
  async tidy(): Promise<void> {
    const before = new Date(Date.now() - FORGOTTEN_AFTER_MS);
    await this.dataSource.manager
      .delete(AttemptCount, { until: LessThan(before) })
      .catch((error: unknown) => logFailure(this.logger, error));
  }

  private async makeRow(hash: string): Promise<void> {
    await this.dataSource.query(
      'INSERT IGNORE INTO attempt_counts (subject_hash, count, until) VALUES (?, 0, ?)',
      [hash, new Date()],
    );
  }
}

async function countOne(manager: EntityManager, subject: AttemptSubject, now: Date): Promise<void> {
  const { limit } = subject;
  const hash = hashOf(subject);
  const row = await manager.findOne(AttemptCount, { where: { hash }, lock: { mode: 'pessimistic_write' } });
  const wait = row === null ? 0 : (row.until.getTime() - now.getTime()) / 1000;
  // Attempts of one moment may be counted in another order than they came: those that are free make nobody wait.
  if (row !== null && row.count >= limit.free && wait > 0) throw tooMany(Math.ceil(wait));
  const count = row !== null && -wait < limit.longestWait ? row.count + 1 : 1;
  const until = new Date(now.getTime() + 1000 * waitAfter(count, limit));
  await manager.upsert(AttemptCount, { hash, count, until }, ['hash']);
}

function tooMany(retryAfter: number): DomainError {
  return new DomainError('request.too-many', `Too many attempts: try again in ${retryAfter} s.`, {
    retryAfter,
  });
}

function hashOf({ limit, of }: AttemptSubject): string {
  return createHash('sha256').update(`${limit.name} ${of}`).digest('hex');
}
