import { Column, Entity, JoinColumn, OneToOne, PrimaryColumn, type Relation } from 'typeorm';
import { Team } from '../../teams/entities/team.entity.js';

@Entity('price_settings')
export class PriceSettings {
  @PrimaryColumn({ name: 'team_id', type: 'int', unsigned: true })
  teamId: number;

  @OneToOne(() => Team, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'team_id', foreignKeyConstraintName: 'price_settings_team' })
  team: Relation<Team>;

  /** In which the team sees every price. */
  @Column({ type: 'char', length: 3, default: 'EUR' })
  currency: string;

  @Column({ name: 'stale_after_days', type: 'int', unsigned: true, default: 90 })
  staleAfterDays: number;

  /** Goes up by one with each change of offers, rates or settings. */
  @Column({ type: 'int', unsigned: true, default: 1 })
  revision: number;
}
