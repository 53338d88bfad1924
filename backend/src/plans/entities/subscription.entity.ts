import {
  SUBSCRIPTION_STATUSES,
  type SubscriptionFacts,
  type SubscriptionStatus,
} from '@roothertz/common/access';
import { Column, Entity, Index, JoinColumn, OneToOne, PrimaryColumn, type Relation } from 'typeorm';
import { Team } from '../../teams/entities/team.entity.js';

/** A team's trial and what the payment service last said of its subscription; a team without one is on Free. */
@Entity('subscriptions')
@Index('subscriptions_customer', ['customerId'], { unique: true })
export class Subscription implements SubscriptionFacts {
  @PrimaryColumn({ name: 'team_id', type: 'int', unsigned: true })
  teamId: number;

  @OneToOne(() => Team, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'team_id', foreignKeyConstraintName: 'subscriptions_team' })
  team: Relation<Team>;

  @Column({ name: 'trial_ends_at', type: 'datetime', precision: 3, nullable: true })
  trialEndsAt: Date | null;

  /** The team's customer at the payment service; null = none was made yet. */
  @Column({ name: 'customer_id', type: 'varchar', length: 255, nullable: true, collation: 'utf8mb4_bin' })
  customerId: string | null;

  /** null beside a status = the plan was granted without payment. */
  @Column({ name: 'subscription_id', type: 'varchar', length: 255, nullable: true, collation: 'utf8mb4_bin' })
  subscriptionId: string | null;

  @Column({ type: 'enum', enum: SUBSCRIPTION_STATUSES, nullable: true })
  status: SubscriptionStatus | null;

  @Column({ type: 'int', unsigned: true, default: 0 })
  seats: number;

  @Column({ name: 'current_period_end', type: 'datetime', precision: 3, nullable: true })
  currentPeriodEnd: Date | null;

  /** When the subscription is set to end. */
  @Column({ name: 'ends_at', type: 'datetime', precision: 3, nullable: true })
  endsAt: Date | null;

  @Column({ name: 'past_due_since', type: 'datetime', precision: 3, nullable: true })
  pastDueSince: Date | null;
}
