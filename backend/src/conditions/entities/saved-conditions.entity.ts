import type { OperatingConditions, PartFilter, RankingTarget } from '@roothertz/common/conditions';
import {
  Column,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  OneToMany,
  PrimaryGeneratedColumn,
  type Relation,
} from 'typeorm';
import { Team } from '../../teams/entities/team.entity.js';
import { User } from '../../users/entities/user.entity.js';
import { SavedConditionsPart } from './saved-conditions-part.entity.js';

@Entity('saved_conditions')
@Index('saved_conditions_name', ['teamId', 'nameKey'], { unique: true })
export class SavedConditions {
  @PrimaryGeneratedColumn({ unsigned: true })
  id: number;

  @Column({ name: 'team_id', type: 'int', unsigned: true })
  teamId: number;

  @ManyToOne(() => Team, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'team_id', foreignKeyConstraintName: 'saved_conditions_team' })
  team: Relation<Team>;

  @Column({ type: 'varchar', length: 120 })
  name: string;

  /** The name without case; folding can make 120 characters 360. */
  @Column({ name: 'name_key', type: 'varchar', length: 360, collation: 'utf8mb4_bin' })
  nameKey: string;

  @Column({ type: 'json' })
  conditions: OperatingConditions;

  @Column({ type: 'json' })
  filter: PartFilter;

  @Column({ type: 'json' })
  target: RankingTarget;

  @Column({ type: 'int', unsigned: true })
  quantity: number;

  @OneToMany(() => SavedConditionsPart, ({ conditions }) => conditions)
  parts: Relation<SavedConditionsPart>[];

  @Column({ type: 'int', unsigned: true, default: 1 })
  version: number;

  @Column({ name: 'created_at', type: 'datetime', precision: 3 })
  createdAt: Date;

  @Column({ name: 'created_by', type: 'int', unsigned: true, nullable: true })
  createdById: number | null;

  @ManyToOne(() => User, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'created_by', foreignKeyConstraintName: 'saved_conditions_created_by' })
  createdBy: Relation<User> | null;

  @Column({ name: 'updated_at', type: 'datetime', precision: 3 })
  updatedAt: Date;

  @Column({ name: 'updated_by', type: 'int', unsigned: true, nullable: true })
  updatedById: number | null;

  @ManyToOne(() => User, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'updated_by', foreignKeyConstraintName: 'saved_conditions_updated_by' })
  updatedBy: Relation<User> | null;
}
