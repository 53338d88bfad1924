import { Injectable } from '@nestjs/common';
import type { Account } from '../users/account.js';
import { UsersService } from '../users/users.service.js';
import { signInSubjects } from './attempt-limits.js';
import { Attempts } from './attempts.service.js';
import { fieldError } from './password-rules.js';
import { passwordMatches } from './passwords.js';
import type { SessionCaller } from './session-caller.js';

/** Asks a signed-in person for the password again, before what can't be undone. */
@Injectable()
export class PasswordCheck {
  constructor(
    private readonly users: UsersService,
    private readonly attempts: Attempts,
  ) {}

  /** @throws naming the field where the password is wrong; guessing is slowed as at the sign-in */
  async assert(
    { userId }: SessionCaller,
    address: string,
    password: string,
    field: string,
  ): Promise<Account> {
    const account = await this.users.get(userId);
    const subjects = signInSubjects(account.email, address);
    await this.attempts.count(subjects);
    if (!(await passwordMatches(password, account.passwordHash)))
      throw fieldError(field, 'This is not your password.');
    await this.attempts.succeed(subjects);
    return account;
  }
}
