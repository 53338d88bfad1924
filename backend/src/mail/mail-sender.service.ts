import {
  type BeforeApplicationShutdown,
  Injectable,
  Logger,
  type OnApplicationBootstrap,
} from '@nestjs/common';
import { Interval } from '@nestjs/schedule';
import { InjectDataSource } from '@nestjs/typeorm';
import type { MailKind } from '@roothertz/common/mail';
import { type DataSource, IsNull, LessThan, LessThanOrEqual } from 'typeorm';
import { AppConfig } from '../config/app-config.js';
import { logFailure } from '../shared/errors/log-failure.js';
import { shortened } from '../shared/text/shortened.js';
import { OutboxMail } from './entities/outbox-mail.entity.js';
import { isRefusedForGood, mailTransport } from './mail-transport.js';
import { UnsubscribeLinks } from './unsubscribe-links.service.js';

const LOOK_EVERY_MS = 10_000;
const BATCH = 20;
const MOST_ATTEMPTS = 10;
const FIRST_PAUSE_MS = 120_000;
const LONGEST_PAUSE_MS = 6 * 3_600_000;
const TIDY_EVERY_MS = 3_600_000;
const KEPT_MS = 90 * 24 * 3_600_000;

/**
 * Sends what stands in the outbox. A process claims a message by counting its attempt, which only one of several can
 * do, and the claim holds until the next attempt is due: a message whose sender was killed is then sent again, under
 * the same Message-ID.
 */
@Injectable()
export class MailSender implements OnApplicationBootstrap, BeforeApplicationShutdown {
  private readonly logger = new Logger(MailSender.name);
  private readonly transport = mailTransport(this.config);
  private running?: Promise<void>;
  private askedAgain = false;
  private stopping = false;

  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly config: AppConfig,
    private readonly links: UnsubscribeLinks,
  ) {}

  onApplicationBootstrap(): void {
    if (this.transport === null) this.logger.warn('No SMTP_HOST: e-mails stay in the outbox.');
    this.nudge();
  }

  async beforeApplicationShutdown(): Promise<void> {
    this.stopping = true;
    await this.running;
  }

  /** Looks into the outbox now; returns at once. */
  @Interval(LOOK_EVERY_MS)
  nudge(): void {
    this.askedAgain = true;
    this.running ??= this.run().finally(() => (this.running = undefined));
  }

  /** Sends what is due, one after another. */
  async sendDue(): Promise<void> {
    for (;;) {
      const due = await this.dataSource.manager.find(OutboxMail, {
        where: { nextAttemptAt: LessThanOrEqual(new Date()) },
        order: { id: 'ASC' },
        take: BATCH,
      });
      for (const mail of due) {
        if (this.stopping) return;
        if (await this.claim(mail)) await this.send(mail);
      }
      if (due.length < BATCH) return;
    }
  }

  /** Forgets what was sent or given up long ago. */
  @Interval(TIDY_EVERY_MS)
  async tidy(): Promise<void> {
    const before = new Date(Date.now() - KEPT_MS);
    await this.dataSource.manager
      .delete(OutboxMail, { nextAttemptAt: IsNull(), createdAt: LessThan(before) })
      .catch((error: unknown) => logFailure(this.logger, error));
  }

  private async run(): Promise<void> {
    while (this.askedAgain && !this.stopping && this.transport !== null) {
      this.askedAgain = false;
      await this.sendDue().catch((error: unknown) => logFailure(this.logger, error));
    }
  }

  private async claim({ id, attempts }: OutboxMail): Promise<boolean> {
    const now = new Date();
    const pause = Math.min(FIRST_PAUSE_MS * 2 ** attempts, LONGEST_PAUSE_MS);
    const { affected } = await this.dataSource.manager.update(
      OutboxMail,
      { id, attempts, nextAttemptAt: LessThanOrEqual(now) },
      { attempts: attempts + 1, nextAttemptAt: new Date(now.getTime() + pause) },
    );
    return affected === 1;
  }

  private async send(mail: OutboxMail): Promise<void> {
    try {
      await this.transport?.sendMail(this.messageOf(mail));
    } catch (error) {
      return this.noteFailure(mail, error);
    }
    await this.end(mail.id, { sentAt: new Date(), lastError: null });
  }

  private async noteFailure({ id, attempts }: OutboxMail, error: unknown): Promise<void> {
    const lastError = shortened(error instanceof Error ? error.message : String(error), 300);
    this.logger.warn(`E-mail ${id} could not be sent: ${lastError}`);
    const isLast = attempts + 1 >= MOST_ATTEMPTS || isRefusedForGood(error);
    if (isLast) await this.end(id, { failedAt: new Date(), lastError });
    else await this.dataSource.manager.update(OutboxMail, { id }, { lastError });
  }

  private async end(id: number, outcome: Partial<OutboxMail>): Promise<void> {
    const over = { nextAttemptAt: null, html: null, text: null };
    await this.dataSource.manager.update(OutboxMail, { id }, { ...over, ...outcome });
  }

  private messageOf({ kind, userId, messageId, to, subject, html, text }: OutboxMail) {
    const links = this.links.linksFor(kind as MailKind, userId);
    const headers = links && {
      'List-Unsubscribe': `<${links.oneClick}>`,
      'List-Unsubscribe-Post': 'List-Unsubscribe=One-Click',
    };
    const content = { messageId, subject, html: html ?? '', text: text ?? '' };
    return { from: this.config.MAIL_FROM, to: { name: '', address: to }, ...content, headers: headers ?? {} };
  }
}
