import { Entity, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { Part } from '../../library/entities/part.entity.js';
import { SavedConditions } from './saved-conditions.entity.js';

/** A part that was chosen at saved conditions. */
@Entity('saved_conditions_parts')
export class SavedConditionsPart {
  @PrimaryColumn({ name: 'conditions_id', type: 'int', unsigned: true })
  conditionsId: number;

  @ManyToOne(() => SavedConditions, ({ parts }) => parts, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'conditions_id', foreignKeyConstraintName: 'saved_conditions_parts_conditions' })
  conditions: Relation<SavedConditions>;

  @PrimaryColumn({ name: 'part_id', type: 'int', unsigned: true })
  partId: number;

  @ManyToOne(() => Part, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'part_id', foreignKeyConstraintName: 'saved_conditions_parts_part' })
  part: Relation<Part>;
}
