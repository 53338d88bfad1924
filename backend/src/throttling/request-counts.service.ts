import { Injectable, Logger } from '@nestjs/common';
import { Interval } from '@nestjs/schedule';
import type { ThrottlerStorage } from '@nestjs/throttler';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource } from 'typeorm';
import { logFailure } from '../shared/errors/log-failure.js';

const TIDY_EVERY_MS = 60_000;

/** Begins anew where the time is over. The count comes before `until`, for each sees what stands before it as new. */
const COUNT_ONE = `
  INSERT INTO request_counts (request_hash, count, until)
  VALUES (?, 1, UTC_TIMESTAMP(3) + INTERVAL ? MICROSECOND)
  ON DUPLICATE KEY UPDATE
    count = IF(until > UTC_TIMESTAMP(3), count + 1, 1),
    until = IF(until > UTC_TIMESTAMP(3), until, VALUE(until))
  RETURNING count, TIMESTAMPDIFF(MICROSECOND, UTC_TIMESTAMP(3), until) AS microseconds`;

/** Where a request stands in the count of its like. */
type Standing = Awaited<ReturnType<ThrottlerStorage['increment']>>;

/** Counts requests in the database, so that a limit is one for all processes of the API. */
@Injectable()
export class RequestCounts implements ThrottlerStorage {
  private readonly logger = new Logger(RequestCounts.name);

  constructor(@InjectDataSource() private readonly dataSource: DataSource) {}

  /** What can't be counted is let through: the count guards the server, and must not be what ends it. */
  async increment(key: string, ttl: number, limit: number): Promise<Standing> {
    return this.countOne(key, ttl, limit).catch((error: unknown) => {
      logFailure(this.logger, error);
      return { totalHits: 0, timeToExpire: 0, isBlocked: false, timeToBlockExpire: 0 };
    });
  }

  @Interval(TIDY_EVERY_MS)
  async tidy(): Promise<void> {
    await this.dataSource
      .query('DELETE FROM request_counts WHERE until <= UTC_TIMESTAMP(3)')
      .catch((error: unknown) => logFailure(this.logger, error));
  }

  private async countOne(key: string, ttl: number, limit: number): Promise<Standing> {
    const [{ count, microseconds }] = await this.dataSource.query(COUNT_ONE, [key, ttl * 1000]);
    const isBlocked = count > limit;
    const left = Math.max(1, Math.ceil(microseconds / 1e6));
    return { totalHits: count, timeToExpire: left, isBlocked, timeToBlockExpire: isBlocked ? left : 0 };
  }
}
