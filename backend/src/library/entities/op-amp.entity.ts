import { type Amplifier, type AmplifierOrigins, OP_AMP_CATALOGUE } from '@roothertz/common/parts';
import { Column, Entity, JoinColumn, OneToOne, PrimaryColumn, type Relation } from 'typeorm';
import { parameterColumns } from './parameter-columns.js';
import { Part } from './part.entity.js';

const AmplifierColumns = parameterColumns(OP_AMP_CATALOGUE);

@Entity('op_amps')
export class OpAmp {
  @PrimaryColumn({ name: 'part_id', type: 'int', unsigned: true })
  partId: number;

  @OneToOne(() => Part, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'part_id', foreignKeyConstraintName: 'op_amps_part' })
  part: Relation<Part>;

  @Column(() => AmplifierColumns, { prefix: false })
  amplifier: Amplifier;

  @Column({ type: 'json' })
  origins: AmplifierOrigins;
}
