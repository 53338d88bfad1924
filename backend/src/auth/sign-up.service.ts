import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource, EntityManager } from 'typeorm';
import { MailQueue } from '../mail/mail-queue.service.js';
import { duplicateAs } from '../shared/errors/duplicate-entry.js';
import { UsersService } from '../users/users.service.js';
import { accountExistsLetter, confirmSignUpLetter } from './account-letters.js';
import { AccountTokens } from './account-tokens.service.js';
import { mailSubjects } from './attempt-limits.js';
import { Attempts } from './attempts.service.js';
import type { AccountToken } from './entities/account-token.entity.js';
import { OwnTeams } from './own-teams.service.js';
import { hashPassword } from './passwords.js';
import { takingAtLeast } from './taking-at-least.js';
import type { SignUpDetails } from './token-purposes.js';

export interface SignUp {
  name: string;
  email: string;
  password: string;
  teamName: string;
}

const ANSWERED_AFTER_MS = 400;

const refuseTaken = duplicateAs('account.exists', 'This address has an account already: sign in.');

/**
 * Makes accounts. Until its address is confirmed a sign-up stands in its link alone, so that nobody can take a name,
 * a place in a team or somebody's address by it, and each link makes the account that was asked for with it.
 */
@Injectable()
export class SignUpService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly users: UsersService,
    private readonly ownTeams: OwnTeams,
    private readonly tokens: AccountTokens,
    private readonly attempts: Attempts,
    private readonly mail: MailQueue,
  ) {}

  /** Sends a link to the address; whether there is an account already, only its mailbox learns. */
  async signUp(asked: SignUp, address: string): Promise<void> {
    await this.attempts.count(mailSubjects(asked.email, address));
    await takingAtLeast(ANSWERED_AFTER_MS, this.send(asked));
  }

  /** Makes the account and its own team, of which the person is the admin. */
  async confirm(manager: EntityManager, { email, details }: AccountToken): Promise<void> {
    const { name, teamName, passwordHash } = details as SignUpDetails;
    const userId = await this.users.create(manager, { email, name, passwordHash }).catch(refuseTaken);
    await this.ownTeams.found(manager, teamName, userId);
  }

  private async send({ email, name, teamName, password }: SignUp): Promise<void> {
    const passwordHash = await hashPassword(password);
    const account = await this.users.findByEmail(email);
    await this.dataSource.transaction(async (manager) => {
      if (account !== null) {
        const to = { email, userId: account.id };
        await this.mail.enqueue(manager, { kind: 'account-exists', to, letter: accountExistsLetter() });
        return;
      }
      const details = { name, teamName, passwordHash };
      const token = await this.tokens.issue(manager, { purpose: 'sign-up', userId: null, email, details });
      const letter = confirmSignUpLetter(name, token);
      await this.mail.enqueue(manager, { kind: 'confirm-address', to: { email, userId: null }, letter });
    });
  }
}
