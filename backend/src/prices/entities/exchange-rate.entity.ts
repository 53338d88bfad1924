import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { Team } from '../../teams/entities/team.entity.js';
import { User } from '../../users/entities/user.entity.js';

/** What a unit of a currency is worth in the base currency, from a day on until the next rate. */
@Entity('exchange_rates')
export class ExchangeRate {
  @PrimaryColumn({ name: 'team_id', type: 'int', unsigned: true })
  teamId: number;

  @ManyToOne(() => Team, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'team_id', foreignKeyConstraintName: 'exchange_rates_team' })
  team: Relation<Team>;

  /** The team's currency at the time. */
  @PrimaryColumn({ name: 'base_currency', type: 'char', length: 3 })
  baseCurrency: string;

  @PrimaryColumn({ type: 'char', length: 3 })
  currency: string;

  @PrimaryColumn({ type: 'date', utc: true })
  dated: string;

  @Column({ type: 'decimal', precision: 18, scale: 8 })
  rate: string;

  @Column({ name: 'updated_at', type: 'datetime', precision: 3 })
  updatedAt: Date;

  @Column({ name: 'updated_by', type: 'int', unsigned: true, nullable: true })
  updatedById: number | null;

  @ManyToOne(() => User, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'updated_by', foreignKeyConstraintName: 'exchange_rates_updated_by' })
  updatedBy: Relation<User> | null;
}
