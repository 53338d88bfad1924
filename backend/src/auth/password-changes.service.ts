import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { MailQueue } from '../mail/mail-queue.service.js';
import type { Account } from '../users/account.js';
import { UsersService } from '../users/users.service.js';
import { passwordChangedLetter } from './account-letters.js';
import { AccountTokens } from './account-tokens.service.js';
import { hashPassword } from './passwords.js';
import { SessionsService } from './sessions.service.js';

/** What a new password brings with it, however it came to be set. */
@Injectable()
export class PasswordChanges {
  constructor(
    private readonly users: UsersService,
    private readonly sessions: SessionsService,
    private readonly tokens: AccountTokens,
    private readonly mail: MailQueue,
  ) {}

  /** Sets the password, ends the sessions but the kept one and the links that would set another, and tells the owner. */
  async set(manager: EntityManager, userId: number, password: string, keptId: number | null): Promise<void> {
    await this.users.change(manager, userId, { passwordHash: await hashPassword(password) });
    await this.sessions.endOthers(manager, userId, keptId);
    await this.tokens.revoke(manager, userId, ['reset-password', 'change-address']);
    await this.tell(manager, await this.users.get(userId));
  }

  private async tell(manager: EntityManager, { id: userId, email, name }: Account): Promise<void> {
    const letter = passwordChangedLetter(name);
    await this.mail.enqueue(manager, { kind: 'password-changed', to: { email, userId }, letter });
  }
}
