import type { Lifecycle } from '@roothertz/common/parts';
import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { SavedConditionsPart } from '../../conditions/entities/saved-conditions-part.entity.js';
import type { WatchedState } from '../watched-state.js';

/** What those who chose a part at saved conditions know of it. */
@Entity('part_watches')
export class PartWatch implements WatchedState {
  @PrimaryColumn({ name: 'conditions_id', type: 'int', unsigned: true })
  conditionsId: number;

  @PrimaryColumn({ name: 'part_id', type: 'int', unsigned: true })
  partId: number;

  @ManyToOne(() => SavedConditionsPart, { onDelete: 'CASCADE' })
  @JoinColumn([
    {
      name: 'conditions_id',
      referencedColumnName: 'conditionsId',
      foreignKeyConstraintName: 'part_watches_chosen',
    },
    { name: 'part_id', referencedColumnName: 'partId', foreignKeyConstraintName: 'part_watches_chosen' },
  ])
  chosen: Relation<SavedConditionsPart>;

  @Column({ type: 'varchar', length: 20 })
  lifecycle: Lifecycle;

  @Column({ type: 'boolean' })
  available: boolean;

  @Column({ type: 'int', unsigned: true })
  quantity: number;

  /** At the quantity; of a small part of a large order it can have many digits. */
  @Column({ name: 'unit_price', type: 'decimal', precision: 40, scale: 4, nullable: true })
  unitPrice: string | null;

  @Column({ type: 'char', length: 3, nullable: true })
  currency: string | null;
}
