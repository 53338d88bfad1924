import type { Approval, Lifecycle } from '@roothertz/common/parts';
import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { Part } from './part.entity.js';
import { StandingChange } from './standing-change.entity.js';

/** How a part stood before a change of many. */
@Entity('standings_before')
export class StandingBefore {
  @PrimaryColumn({ name: 'change_id', type: 'int', unsigned: true })
  changeId: number;

  @ManyToOne(() => StandingChange, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'change_id', foreignKeyConstraintName: 'standings_before_change' })
  change: Relation<StandingChange>;

  @PrimaryColumn({ name: 'part_id', type: 'int', unsigned: true })
  partId: number;

  @ManyToOne(() => Part, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'part_id', foreignKeyConstraintName: 'standings_before_part' })
  part: Relation<Part>;

  /** The version that the change has made. */
  @Column({ type: 'int', unsigned: true })
  version: number;

  @Column({ type: 'varchar', length: 20 })
  lifecycle: Lifecycle;

  @Column({ type: 'varchar', length: 20 })
  approval: Approval;
}
