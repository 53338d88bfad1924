import { NOTICE_KINDS, type NoticeKind } from '@roothertz/common/mail';
import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource } from 'typeorm';
import type { Caller } from '../shared/access/caller.js';
import { DomainError } from '../shared/errors/domain-error.js';
import { type MailPreferencesDto, toMailPreferences } from './dto/mail-preferences.dto.js';
import { RefusedMail } from './entities/refused-mail.entity.js';
import { type Refusal, UnsubscribeLinks } from './unsubscribe-links.service.js';

/** Which notices a member wants: all that aren't refused. */
@Injectable()
export class MailPreferences {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly links: UnsubscribeLinks,
  ) {}

  async list({ userId }: Caller): Promise<MailPreferencesDto> {
    const refused = await this.dataSource.manager.findBy(RefusedMail, { userId });
    return toMailPreferences(
      NOTICE_KINDS,
      refused.map(({ kind }) => kind),
    );
  }

  async change(caller: Caller, kind: NoticeKind, wanted: boolean): Promise<MailPreferencesDto> {
    const { userId } = caller;
    if (wanted) await this.dataSource.manager.delete(RefusedMail, { userId, kind });
    else await this.refuse({ userId, kind });
    return this.list(caller);
  }

  /** What a link in a message stops. */
  readLink(token: string): Refusal {
    const refusal = this.links.read(token);
    if (refusal === null)
      throw new DomainError('mail.unknown-link', 'This link isn’t whole: open it from the e-mail again.');
    return refusal;
  }

  async refuseByLink(token: string): Promise<Refusal> {
    const refusal = this.readLink(token);
    await this.refuse(refusal);
    return refusal;
  }

  /** Of an account that is gone there is nothing to refuse. */
  private async refuse({ userId, kind }: Refusal): Promise<void> {
    await this.dataSource.query(
      'INSERT IGNORE INTO refused_mails (user_id, kind, at) SELECT id, ?, ? FROM users WHERE id = ?',
      [kind, new Date(), userId],
    );
  }
}
