import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource, EntityManager } from 'typeorm';
import { MailQueue } from '../mail/mail-queue.service.js';
import { duplicateAs } from '../shared/errors/duplicate-entry.js';
import { UsersService } from '../users/users.service.js';
import { accountExistsLetter, addressChangedLetter, confirmAddressLetter } from './account-letters.js';
import { AccountTokens } from './account-tokens.service.js';
import { mailSubjects } from './attempt-limits.js';
import { Attempts } from './attempts.service.js';
import type { AccountToken } from './entities/account-token.entity.js';
import { PasswordChanges } from './password-changes.service.js';
import { PasswordCheck } from './password-check.service.js';
import { assertPassword, fieldError } from './password-rules.js';
import type { SessionCaller } from './session-caller.js';
import { SessionsService } from './sessions.service.js';
import { takingAtLeast } from './taking-at-least.js';
import type { AddressDetails } from './token-purposes.js';

const ANSWERED_AFTER_MS = 150;

const refuseTaken = duplicateAs('account.exists', 'This address has an account of its own already.');

/** What a person changes of their own account. */
@Injectable()
export class AccountService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly users: UsersService,
    private readonly check: PasswordCheck,
    private readonly passwords: PasswordChanges,
    private readonly sessions: SessionsService,
    private readonly tokens: AccountTokens,
    private readonly attempts: Attempts,
    private readonly mail: MailQueue,
  ) {}

  rename({ userId }: SessionCaller, name: string): Promise<void> {
    return this.users.change(this.dataSource.manager, userId, { name });
  }

  async changePassword(caller: SessionCaller, address: string, current: string, next: string): Promise<void> {
    const { id, email } = await this.check.assert(caller, address, current, 'currentPassword');
    assertPassword(next, email, 'newPassword');
    if (current === next) throw fieldError('newPassword', 'This is the password that you have already.');
    await this.dataSource.transaction((manager) => this.passwords.set(manager, id, next, caller.sessionId));
  }

  /** Asks the new address for its consent; until then the old one stays. */
  async askForAddress(
    caller: SessionCaller,
    address: string,
    password: string,
    email: string,
  ): Promise<void> {
    const account = await this.check.assert(caller, address, password, 'password');
    if (account.email === email) throw fieldError('email', 'This is the address that you have already.');
    await this.attempts.count(mailSubjects(email, address));
    const work = this.dataSource.transaction((manager) => this.sendTo(manager, caller, account.name, email));
    await takingAtLeast(ANSWERED_AFTER_MS, work);
  }

  /** Takes the new address, tells the old one, and ends the sessions but the one that asked. */
  async confirmAddress(manager: EntityManager, { userId, email, details }: AccountToken): Promise<void> {
    const { id, email: oldAddress, name } = await this.users.get(userId as number);
    await this.users.change(manager, id, { email }).catch(refuseTaken);
    await this.sessions.endOthers(manager, id, (details as AddressDetails).sessionId);
    await this.tokens.revoke(manager, id, ['reset-password', 'change-address']);
    const to = { email: oldAddress, userId: id };
    const letter = addressChangedLetter(name, email);
    await this.mail.enqueue(manager, { kind: 'address-changed', to, letter });
  }

  private async sendTo(
    manager: EntityManager,
    { userId, sessionId }: SessionCaller,
    name: string,
    email: string,
  ): Promise<void> {
    const other = await this.users.findByEmail(email);
    if (other !== null) {
      const to = { email, userId: other.id };
      await this.mail.enqueue(manager, { kind: 'account-exists', to, letter: accountExistsLetter() });
      return;
    }
    const details = { sessionId };
    const token = await this.tokens.issue(manager, { purpose: 'change-address', userId, email, details });
    const letter = confirmAddressLetter(name, token);
    await this.mail.enqueue(manager, { kind: 'confirm-address', to: { email, userId }, letter });
  }
}
