import { Column, Entity, JoinColumn, ManyToOne, PrimaryGeneratedColumn, type Relation } from 'typeorm';
import { Membership } from '../../teams/entities/membership.entity.js';
import { Team } from '../../teams/entities/team.entity.js';
import { User } from '../../users/entities/user.entity.js';

/** A sign-in that isn't over: its token is good for as long as this row stands. */
@Entity('sessions')
export class Session {
  @PrimaryGeneratedColumn({ unsigned: true })
  id: number;

  @Column({ name: 'user_id', type: 'int', unsigned: true })
  userId: number;

  @ManyToOne(() => User, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'user_id', foreignKeyConstraintName: 'sessions_user' })
  user: Relation<User>;

  /** The team in which the person works. */
  @Column({ name: 'team_id', type: 'int', unsigned: true })
  teamId: number;

  @ManyToOne(() => Team, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'team_id', foreignKeyConstraintName: 'sessions_team' })
  team: Relation<Team>;

  /** Ends the session with it. */
  @ManyToOne(() => Membership, { onDelete: 'CASCADE' })
  @JoinColumn([
    { name: 'user_id', referencedColumnName: 'userId', foreignKeyConstraintName: 'sessions_membership' },
    { name: 'team_id', referencedColumnName: 'teamId', foreignKeyConstraintName: 'sessions_membership' },
  ])
  membership: Relation<Membership>;

  @Column({ name: 'created_at', type: 'datetime', precision: 3 })
  createdAt: Date;

  @Column({ name: 'last_seen_at', type: 'datetime', precision: 3 })
  lastSeenAt: Date;

  /** What the browser calls itself. */
  @Column({ name: 'user_agent', type: 'varchar', length: 300 })
  userAgent: string;

  /** The network address from which the sign-in came. */
  @Column({ type: 'varchar', length: 45 })
  address: string;
}
