import type { PartKind } from '@roothertz/common/parts';
import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryGeneratedColumn, type Relation } from 'typeorm';
import { Team } from '../../teams/entities/team.entity.js';
import { User } from '../../users/entities/user.entity.js';

/** A change of how all parts of a filter stand, kept for a while so that it can be taken back. */
@Entity('standing_changes')
@Index('standing_changes_made', ['teamId', 'madeAt'])
export class StandingChange {
  @PrimaryGeneratedColumn({ unsigned: true })
  id: number;

  @Column({ name: 'team_id', type: 'int', unsigned: true })
  teamId: number;

  @ManyToOne(() => Team, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'team_id', foreignKeyConstraintName: 'standing_changes_team' })
  team: Relation<Team>;

  @Column({ type: 'varchar', length: 20 })
  kind: PartKind;

  @Column({ name: 'part_count', type: 'int', unsigned: true })
  partCount: number;

  @Column({ name: 'made_at', type: 'datetime', precision: 3 })
  madeAt: Date;

  @Column({ name: 'made_by', type: 'int', unsigned: true, nullable: true })
  madeById: number | null;

  @ManyToOne(() => User, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'made_by', foreignKeyConstraintName: 'standing_changes_made_by' })
  madeBy: Relation<User> | null;
}
