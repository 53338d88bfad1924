import {
  type Amplifier,
  type AmplifierOrigins,
  canBeUnknown,
  OP_AMP_PARAMETERS,
  type OpAmpParameterKey,
} from '@roothertz/common/parts';
import { Column, Entity, JoinColumn, OneToOne, PrimaryColumn, type Relation } from 'typeorm';
import { Part } from './part.entity.js';

/** A column for each parameter of the catalogue, in SI units. */
class AmplifierColumns {}
Column({ name: 'input_type', type: 'varchar', length: 20, nullable: true })(
  AmplifierColumns.prototype,
  'inputType',
);
for (const parameter of OP_AMP_PARAMETERS)
  Column({ name: parameterColumn(parameter.key), type: 'double', nullable: canBeUnknown(parameter) })(
    AmplifierColumns.prototype,
    parameter.key,
  );

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

/** The database's name of a parameter's column: `voltageNoise` → `voltage_noise`. */
export function parameterColumn(key: OpAmpParameterKey): string {
  return key.replace(/[A-Z]/g, (letter) => `_${letter.toLowerCase()}`);
}
