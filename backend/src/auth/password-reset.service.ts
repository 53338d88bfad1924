import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource } from 'typeorm';
import { MailQueue } from '../mail/mail-queue.service.js';
import type { Account } from '../users/account.js';
import { UsersService } from '../users/users.service.js';
import { resetPasswordLetter } from './account-letters.js';
import { AccountTokens } from './account-tokens.service.js';
import { mailSubjects } from './attempt-limits.js';
import { Attempts } from './attempts.service.js';
import { PasswordChanges } from './password-changes.service.js';
import { assertPassword } from './password-rules.js';
import { takingAtLeast } from './taking-at-least.js';

const ANSWERED_AFTER_MS = 150;

/** A new password for who has forgotten theirs. */
@Injectable()
export class PasswordReset {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly users: UsersService,
    private readonly tokens: AccountTokens,
    private readonly attempts: Attempts,
    private readonly passwords: PasswordChanges,
    private readonly mail: MailQueue,
  ) {}

  /** Sends a link where the address has an account; the answer is the same where it has none. */
  async ask(email: string, address: string): Promise<void> {
    await this.attempts.count(mailSubjects(email, address));
    const account = await this.users.findByEmail(email);
    await takingAtLeast(ANSWERED_AFTER_MS, account === null ? Promise.resolve() : this.send(account));
  }

  /** Sets the password and ends every session. */
  async reset(secret: string, password: string): Promise<void> {
    const { email } = await this.tokens.read(secret);
    assertPassword(password, email, 'password');
    await this.dataSource.transaction(async (manager) => {
      const { userId } = await this.tokens.use(manager, secret, ['reset-password']);
      await this.passwords.set(manager, userId as number, password, null);
    });
  }

  private async send({ id: userId, email, name }: Account): Promise<void> {
    await this.dataSource.transaction(async (manager) => {
      const token = await this.tokens.issue(manager, {
        purpose: 'reset-password',
        userId,
        email,
        details: {},
      });
      const letter = resetPasswordLetter(name, token);
      await this.mail.enqueue(manager, { kind: 'reset-password', to: { email, userId }, letter });
    });
  }
}
