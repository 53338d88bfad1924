import { type Role, ROLES } from '@roothertz/common/access';
import {
  Column,
  CreateDateColumn,
  Entity,
  JoinColumn,
  ManyToOne,
  PrimaryColumn,
  type Relation,
} from 'typeorm';
import { User } from '../../users/entities/user.entity.js';
import { Team } from './team.entity.js';

@Entity('memberships')
export class Membership {
  @PrimaryColumn({ name: 'user_id', type: 'int', unsigned: true })
  userId: number;

  @PrimaryColumn({ name: 'team_id', type: 'int', unsigned: true })
  teamId: number;

  @ManyToOne(() => User, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'user_id', foreignKeyConstraintName: 'memberships_user' })
  user: Relation<User>;

  @ManyToOne(() => Team, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'team_id', foreignKeyConstraintName: 'memberships_team' })
  team: Relation<Team>;

  @Column({ type: 'set', enum: ROLES })
  roles: Role[];

  @CreateDateColumn({
    name: 'joined_at',
    type: 'datetime',
    precision: 3,
    default: () => 'CURRENT_TIMESTAMP(3)',
  })
  joinedAt: Date;

  /** When the person last signed in to the team or went over to it; null = never. */
  @Column({ name: 'opened_at', type: 'datetime', precision: 3, nullable: true })
  openedAt: Date | null;
}
