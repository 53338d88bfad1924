import { randomUUID } from 'node:crypto';
import { isNotice, type MailKind } from '@roothertz/common/mail';
import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource, EntityManager, EntitySubscriberInterface, QueryRunner } from 'typeorm';
import { AppConfig } from '../config/app-config.js';
import { shortened } from '../shared/text/shortened.js';
import { OutboxMail } from './entities/outbox-mail.entity.js';
import { RefusedMail } from './entities/refused-mail.entity.js';
import { htmlLetter } from './layout/html-letter.js';
import { textLetter } from './layout/text-letter.js';
import type { Letter } from './letter.js';
import { MailSender } from './mail-sender.service.js';
import { UnsubscribeLinks } from './unsubscribe-links.service.js';

export interface Mail {
  kind: MailKind;
  /** The address, and whose it is; null = nobody's account. */
  to: { email: string; userId: number | null };
  /** The team in whose work the message is sent, if any. */
  teamId?: number;
  letter: Letter;
}

const SUBJECT_LENGTH = 200;

/** The way out for every e-mail: it is written into the outbox with the change that it tells of, and sent after it. */
@Injectable()
export class MailQueue implements EntitySubscriberInterface {
  private readonly mailing = new WeakSet<QueryRunner>();

  constructor(
    private readonly config: AppConfig,
    private readonly links: UnsubscribeLinks,
    private readonly sender: MailSender,
    @InjectDataSource() dataSource: DataSource,
  ) {
    dataSource.subscribers.push(this);
  }

  /**
   * Writes a message into the outbox, in the caller's transaction; the commit sets the sender going.
   * Answers false where the member refuses notices of this kind.
   */
  async enqueue(manager: EntityManager, mail: Mail): Promise<boolean> {
    const { queryRunner } = manager;
    if (!queryRunner?.isTransactionActive) throw new Error('An e-mail is enqueued in a transaction.');
    if (await isRefused(manager, mail)) return false;
    await manager.insert(OutboxMail, this.rowOf(mail));
    this.mailing.add(queryRunner);
    return true;
  }

  afterTransactionCommit({ queryRunner }: { queryRunner: QueryRunner }): void {
    if (!queryRunner.isTransactionActive && this.mailing.delete(queryRunner)) this.sender.nudge();
  }

  private rowOf({ kind, to: { email, userId }, teamId, letter }: Mail) {
    const unsubscribeUrl = this.links.linksFor(kind, userId)?.page ?? null;
    const frame = { origin: this.config.origin, unsubscribeUrl };
    const now = new Date();
    return {
      kind,
      messageId: `<${randomUUID()}@${domainOf(this.config.MAIL_FROM)}>`,
      to: email,
      userId,
      teamId,
      subject: shortened(letter.subject, SUBJECT_LENGTH),
      html: htmlLetter(letter, frame),
      text: textLetter(letter, frame),
      createdAt: now,
      nextAttemptAt: now,
    };
  }
}

async function isRefused(manager: EntityManager, { kind, to: { userId } }: Mail): Promise<boolean> {
  return userId !== null && isNotice(kind) && (await manager.existsBy(RefusedMail, { userId, kind }));
}

function domainOf(mailbox: string): string {
  return mailbox.replace(/^.*@/, '').replace('>', '');
}
