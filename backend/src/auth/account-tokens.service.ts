import { createHash, randomBytes } from 'node:crypto';
import { Injectable, Logger } from '@nestjs/common';
import { Interval } from '@nestjs/schedule';
import { InjectDataSource } from '@nestjs/typeorm';
import { type DataSource, type EntityManager, LessThan } from 'typeorm';
import { DomainError } from '../shared/errors/domain-error.js';
import { logFailure } from '../shared/errors/log-failure.js';
import { AccountToken } from './entities/account-token.entity.js';
import { TOKEN_PURPOSES, type TokenDetails, type TokenPurpose } from './token-purposes.js';

export interface NewToken {
  purpose: TokenPurpose;
  userId: number | null;
  email: string;
  details: TokenDetails;
}

const TIDY_EVERY_MS = 3_600_000;
/** So long a used or expired link is still told apart from one that never was. */
const REMEMBERED_MS = 30 * 24 * 3_600_000;

/** The links in e-mails that confirm an address or set a password: each is good once, for a time. */
@Injectable()
export class AccountTokens {
  private readonly logger = new Logger(AccountTokens.name);

  constructor(@InjectDataSource() private readonly dataSource: DataSource) {}

  /** Stores what a link does, and answers the token that the link carries. */
  async issue(manager: EntityManager, { purpose, ...token }: NewToken): Promise<string> {
    const secret = randomBytes(32).toString('base64url');
    const expiresAt = new Date(Date.now() + 60_000 * TOKEN_PURPOSES[purpose].minutes);
    await manager.insert(AccountToken, { ...token, purpose, hash: hashOf(secret), expiresAt });
    return secret;
  }

  /** What a link would do, without doing it. */
  read(secret: string): Promise<AccountToken> {
    return find(this.dataSource.manager, secret, false);
  }

  /** Uses a link up, in the transaction that does what it stands for: of several at once only one gets it. */
  async use(
    manager: EntityManager,
    secret: string,
    purposes: readonly TokenPurpose[],
  ): Promise<AccountToken> {
    await holdAccount(manager, await find(manager, secret, false));
    const token = await find(manager, secret, true);
    if (!purposes.includes(token.purpose)) throw unknown();
    await manager.update(AccountToken, { id: token.id }, { usedAt: new Date(), details: null });
    return token;
  }

  /** Makes the other links to an account worthless. */
  async revoke(manager: EntityManager, userId: number, purposes: readonly TokenPurpose[]): Promise<void> {
    for (const purpose of purposes)
      await manager.update(AccountToken, { userId, purpose }, { usedAt: new Date(), details: null });
  }

  @Interval(TIDY_EVERY_MS)
  async tidy(): Promise<void> {
    const before = new Date(Date.now() - REMEMBERED_MS);
    await this.dataSource.manager
      .delete(AccountToken, { expiresAt: LessThan(before) })
      .catch((error: unknown) => logFailure(this.logger, error));
  }
}

/** Links to one account are used one after the other, for each may make the others worthless. */
async function holdAccount(manager: EntityManager, { userId }: AccountToken): Promise<void> {
  if (userId !== null) await manager.query('SELECT id FROM users WHERE id = ? FOR UPDATE', [userId]);
}

async function find(manager: EntityManager, secret: string, forUse: boolean): Promise<AccountToken> {
  const lock = forUse ? { mode: 'pessimistic_write' as const } : undefined;
  const token = await manager.findOne(AccountToken, { where: { hash: hashOf(secret) }, lock });
  if (token === null) throw unknown();
  if (token.usedAt !== null)
    throw new DomainError('token.used', 'This link has been used, or a newer one took its place.');
  if (token.expiresAt <= new Date())
    throw new DomainError('token.expired', 'This link is too old: ask for a new one.');
  return token;
}

function unknown(): DomainError {
  return new DomainError('token.unknown', 'This link isn’t whole: open it from the e-mail again.');
}

function hashOf(secret: string): string {
  return createHash('sha256').update(secret).digest('hex');
}
