import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryGeneratedColumn, type Relation } from 'typeorm';
import { User } from '../../users/entities/user.entity.js';
import type { TokenDetails, TokenPurpose } from '../token-purposes.js';

/** What a link in an e-mail stands for, once. The link's token is not stored: only its hash. */
@Entity('account_tokens')
@Index('account_tokens_hash', ['hash'], { unique: true })
export class AccountToken {
  @PrimaryGeneratedColumn({ unsigned: true })
  id: number;

  @Column({ type: 'varchar', length: 20 })
  purpose: TokenPurpose;

  /** SHA-256 in hexadecimal digits. */
  @Column({ name: 'token_hash', type: 'char', length: 64, collation: 'ascii_bin', charset: 'ascii' })
  hash: string;

  /** Whose account it is; null = a sign-up, which has none yet. */
  @Column({ name: 'user_id', type: 'int', unsigned: true, nullable: true })
  userId: number | null;

  @ManyToOne(() => User, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'user_id', foreignKeyConstraintName: 'account_tokens_user' })
  user: Relation<User> | null;

  /** The address to which the link was sent. */
  @Column({ type: 'varchar', length: 254, collation: 'utf8mb4_bin' })
  email: string;

  /** What the link does; null once it is used. */
  @Column({ type: 'json', nullable: true })
  details: TokenDetails | null;

  @Column({ name: 'expires_at', type: 'datetime', precision: 3 })
  expiresAt: Date;

  @Column({ name: 'used_at', type: 'datetime', precision: 3, nullable: true })
  usedAt: Date | null;
}
