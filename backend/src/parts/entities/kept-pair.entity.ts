import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { Part } from '../../library/entities/part.entity.js';
import { Team } from '../../teams/entities/team.entity.js';
import { User } from '../../users/entities/user.entity.js';

/** Two parts that look like one, of which a team has decided to keep both; the lower id comes first. */
@Entity('kept_pairs')
export class KeptPair {
  @PrimaryColumn({ name: 'team_id', type: 'int', unsigned: true })
  teamId: number;

  @ManyToOne(() => Team, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'team_id', foreignKeyConstraintName: 'kept_pairs_team' })
  team: Relation<Team>;

  @PrimaryColumn({ name: 'one_id', type: 'int', unsigned: true })
  oneId: number;

  @ManyToOne(() => Part, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'one_id', foreignKeyConstraintName: 'kept_pairs_one' })
  one: Relation<Part>;

  @PrimaryColumn({ name: 'other_id', type: 'int', unsigned: true })
  otherId: number;

  @ManyToOne(() => Part, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'other_id', foreignKeyConstraintName: 'kept_pairs_other' })
  other: Relation<Part>;

  @Column({ name: 'decided_at', type: 'datetime', precision: 3 })
  decidedAt: Date;

  @Column({ name: 'decided_by', type: 'int', unsigned: true, nullable: true })
  decidedById: number | null;

  @ManyToOne(() => User, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'decided_by', foreignKeyConstraintName: 'kept_pairs_decided_by' })
  decidedBy: Relation<User> | null;
}
