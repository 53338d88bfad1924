import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryGeneratedColumn, type Relation } from 'typeorm';
import { Team } from '../../teams/entities/team.entity.js';

@Entity('libraries')
@Index('libraries_team', ['teamId'], { unique: true })
export class Library {
  @PrimaryGeneratedColumn({ unsigned: true })
  id: number;

  /** Null = the curated library, which every team reads. */
  @Column({ name: 'team_id', type: 'int', unsigned: true, nullable: true })
  teamId: number | null;

  @ManyToOne(() => Team, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'team_id', foreignKeyConstraintName: 'libraries_team_key' })
  team: Relation<Team> | null;

  /** Goes up by one with each change of the library's parts. */
  @Column({ type: 'int', unsigned: true, default: 1 })
  revision: number;
}
