import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryGeneratedColumn, type Relation } from 'typeorm';
import { Team } from '../../teams/entities/team.entity.js';
import { User } from '../../users/entities/user.entity.js';

/** A message that is to be sent, or was. */
@Entity('outbox_mails')
@Index('outbox_mails_due', ['nextAttemptAt'])
@Index('outbox_mails_message', ['messageId'], { unique: true })
export class OutboxMail {
  @PrimaryGeneratedColumn({ unsigned: true })
  id: number;

  @Column({ type: 'varchar', length: 40 })
  kind: string;

  /** Made with the row: what is sent twice, after a crash, carries the same. */
  @Column({ name: 'message_id', type: 'varchar', length: 320 })
  messageId: string;

  @Column({ type: 'varchar', length: 254 })
  to: string;

  @Column({ name: 'user_id', type: 'int', unsigned: true, nullable: true })
  userId: number | null;

  @ManyToOne(() => User, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'user_id', foreignKeyConstraintName: 'outbox_mails_user' })
  user: Relation<User> | null;

  @Column({ name: 'team_id', type: 'int', unsigned: true, nullable: true })
  teamId: number | null;

  @ManyToOne(() => Team, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'team_id', foreignKeyConstraintName: 'outbox_mails_team' })
  team: Relation<Team> | null;

  @Column({ type: 'varchar', length: 200 })
  subject: string;

  /** Null once it is sent or given up: the links in it may open an account. */
  @Column({ type: 'mediumtext', nullable: true })
  html: string | null;

  @Column({ type: 'mediumtext', nullable: true })
  text: string | null;

  @Column({ name: 'created_at', type: 'datetime', precision: 3 })
  createdAt: Date;

  @Column({ type: 'tinyint', unsigned: true, default: 0 })
  attempts: number;

  /** Null = never again: it is sent or given up. */
  @Column({ name: 'next_attempt_at', type: 'datetime', precision: 3, nullable: true })
  nextAttemptAt: Date | null;

  @Column({ name: 'sent_at', type: 'datetime', precision: 3, nullable: true })
  sentAt: Date | null;

  @Column({ name: 'failed_at', type: 'datetime', precision: 3, nullable: true })
  failedAt: Date | null;

  @Column({ name: 'last_error', type: 'varchar', length: 300, nullable: true })
  lastError: string | null;
}
