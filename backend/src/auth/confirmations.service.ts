import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource } from 'typeorm';
import { AccountService } from './account.service.js';
import { AccountTokens } from './account-tokens.service.js';
import { SignUpService } from './sign-up.service.js';

/** Does what the link in an e-mail that asks for an address's consent stands for. */
@Injectable()
export class Confirmations {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly tokens: AccountTokens,
    private readonly signUps: SignUpService,
    private readonly accounts: AccountService,
  ) {}

  confirm(secret: string): Promise<void> {
    return this.dataSource.transaction(async (manager) => {
      const token = await this.tokens.use(manager, secret, ['sign-up', 'change-address']);
      if (token.purpose === 'sign-up') await this.signUps.confirm(manager, token);
      else await this.accounts.confirmAddress(manager, token);
    });
  }
}
