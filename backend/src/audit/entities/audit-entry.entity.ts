import type { AuditAction, AuditObject } from '@roothertz/common/audit';
import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryGeneratedColumn, type Relation } from 'typeorm';
import { Team } from '../../teams/entities/team.entity.js';
import { User } from '../../users/entities/user.entity.js';

@Entity('audit_entries')
@Index('audit_entries_at', ['teamId', 'at'])
@Index('audit_entries_object', ['teamId', 'objectKind', 'objectId'])
export class AuditEntry {
  @PrimaryGeneratedColumn({ unsigned: true })
  id: number;

  @Column({ name: 'team_id', type: 'int', unsigned: true })
  teamId: number;

  @ManyToOne(() => Team, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'team_id', foreignKeyConstraintName: 'audit_entries_team' })
  team: Relation<Team>;

  @Column({ name: 'user_id', type: 'int', unsigned: true, nullable: true })
  userId: number | null;

  @ManyToOne(() => User, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'user_id', foreignKeyConstraintName: 'audit_entries_user' })
  user: Relation<User> | null;

  @Column({ type: 'datetime', precision: 3 })
  at: Date;

  @Column({ type: 'varchar', length: 60 })
  action: AuditAction;

  @Column({ name: 'object_kind', type: 'varchar', length: 40 })
  objectKind: AuditObject;

  @Column({ name: 'object_id', type: 'varchar', length: 40 })
  objectId: string;

  /** What the object was called then, where it has a name. */
  @Column({ name: 'object_label', type: 'varchar', length: 250, nullable: true })
  objectLabel: string | null;

  /** What stood before; null = nothing. */
  @Column({ name: 'from_value', type: 'json', nullable: true })
  from: object | null;

  /** What stands since; null = nothing. */
  @Column({ name: 'to_value', type: 'json', nullable: true })
  to: object | null;
}
