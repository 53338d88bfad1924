import { type BeforeApplicationShutdown, Injectable, Logger } from '@nestjs/common';
import { Interval } from '@nestjs/schedule';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource } from 'typeorm';
import { underDatabaseLock } from '../database/database-lock.js';
import { logFailure } from '../shared/errors/log-failure.js';
import { PartNotices } from './part-notices.service.js';
import { PriceDigests } from './price-digests.service.js';

/** What the schedule calls the looks. */
export const NOTICES = 'notices';

const LOOK_EVERY_MS = 60_000;

/** Looks again and again whether there is something to tell; of several processes one does. */
@Injectable()
export class NoticeSchedule implements BeforeApplicationShutdown {
  private readonly logger = new Logger(NoticeSchedule.name);
  private running?: Promise<void>;

  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly parts: PartNotices,
    private readonly digests: PriceDigests,
  ) {}

  async beforeApplicationShutdown(): Promise<void> {
    await this.running;
  }

  @Interval(NOTICES, LOOK_EVERY_MS)
  look(): void {
    this.running ??= this.sendDue(new Date())
      .catch((error: unknown) => logFailure(this.logger, error))
      .finally(() => (this.running = undefined));
  }

  /** Tells what is due; nothing while another process does. */
  async sendDue(now: Date): Promise<void> {
    await underDatabaseLock(this.dataSource, NOTICES, async () => {
      await this.parts.send();
      await this.digests.send(now);
    });
  }
}
