import {
  RESISTOR_CATALOGUE,
  type Resistor as ResistorParameters,
  type ResistorOrigins,
} from '@roothertz/common/parts';
import { Column, Entity, JoinColumn, OneToOne, PrimaryColumn, type Relation } from 'typeorm';
import { parameterColumns } from './parameter-columns.js';
import { Part } from './part.entity.js';

const ResistorColumns = parameterColumns(RESISTOR_CATALOGUE);

@Entity('resistors')
export class Resistor {
  @PrimaryColumn({ name: 'part_id', type: 'int', unsigned: true })
  partId: number;

  @OneToOne(() => Part, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'part_id', foreignKeyConstraintName: 'resistors_part' })
  part: Relation<Part>;

  @Column(() => ResistorColumns, { prefix: false })
  resistor: ResistorParameters;

  @Column({ type: 'json' })
  origins: ResistorOrigins;
}
