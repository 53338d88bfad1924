import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryGeneratedColumn, type Relation } from 'typeorm';
import { Team } from '../../teams/entities/team.entity.js';

@Entity('suppliers')
@Index('suppliers_name', ['teamId', 'nameKey'], { unique: true })
export class Supplier {
  @PrimaryGeneratedColumn({ unsigned: true })
  id: number;

  @Column({ name: 'team_id', type: 'int', unsigned: true })
  teamId: number;

  @ManyToOne(() => Team, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'team_id', foreignKeyConstraintName: 'suppliers_team' })
  team: Relation<Team>;

  @Column({ type: 'varchar', length: 120 })
  name: string;

  /** The name without case; folding can make 120 characters 360. */
  @Column({ name: 'name_key', type: 'varchar', length: 360, collation: 'utf8mb4_bin' })
  nameKey: string;

  @Column({ name: 'created_at', type: 'datetime', precision: 3 })
  createdAt: Date;
}
