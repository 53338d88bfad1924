import { type Role, ROLES } from '@roothertz/common/access';
import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryGeneratedColumn, type Relation } from 'typeorm';
import { User } from '../../../users/entities/user.entity.js';
import { Team } from '../../entities/team.entity.js';

@Entity('invitations')
@Index('invitations_token', ['tokenHash'], { unique: true })
@Index('invitations_open', ['teamId', 'openEmail'], { unique: true })
export class Invitation {
  @PrimaryGeneratedColumn({ unsigned: true })
  id: number;

  @Column({ name: 'team_id', type: 'int', unsigned: true })
  teamId: number;

  @ManyToOne(() => Team, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'team_id', foreignKeyConstraintName: 'invitations_team' })
  team: Relation<Team>;

  /** In lower case. */
  @Column({ type: 'varchar', length: 254, collation: 'utf8mb4_bin' })
  email: string;

  /** The address while the invitation stands, so that a team invites it once at a time; null = accepted or withdrawn. */
  @Column({ name: 'open_email', type: 'varchar', length: 254, collation: 'utf8mb4_bin', nullable: true })
  openEmail: string | null;

  @Column({ type: 'set', enum: ROLES })
  roles: Role[];

  @Column({ name: 'token_hash', type: 'char', length: 64, collation: 'utf8mb4_bin' })
  tokenHash: string;

  @Column({ name: 'invited_by_id', type: 'int', unsigned: true, nullable: true })
  invitedById: number | null;

  @ManyToOne(() => User, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'invited_by_id', foreignKeyConstraintName: 'invitations_invited_by' })
  invitedBy: Relation<User> | null;

  @Column({ name: 'sent_at', type: 'datetime', precision: 3 })
  sentAt: Date;

  @Column({ name: 'expires_at', type: 'datetime', precision: 3 })
  expiresAt: Date;

  @Column({ name: 'accepted_at', type: 'datetime', precision: 3, nullable: true })
  acceptedAt: Date | null;

  @Column({ name: 'revoked_at', type: 'datetime', precision: 3, nullable: true })
  revokedAt: Date | null;
}
