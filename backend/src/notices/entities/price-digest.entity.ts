import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { Team } from '../../teams/entities/team.entity.js';

/** That a team's digest of a week is done: it is never sent twice. */
@Entity('price_digests')
export class PriceDigest {
  @PrimaryColumn({ name: 'team_id', type: 'int', unsigned: true })
  teamId: number;

  @ManyToOne(() => Team, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'team_id', foreignKeyConstraintName: 'price_digests_team' })
  team: Relation<Team>;

  /** The Monday. */
  @PrimaryColumn({ type: 'date', utc: true })
  week: string;

  @Column({ type: 'datetime', precision: 3 })
  at: Date;
}
