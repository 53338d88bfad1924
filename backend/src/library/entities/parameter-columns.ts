import { canBeUnknown, type ListedFields } from '@roothertz/common/parts';
import { Column } from 'typeorm';

/** A class with a column for each parameter of a kind of part, in SI units. */
export function parameterColumns({ choice, parameters }: ListedFields): new () => object {
  class ParameterColumns {}
  Column({ name: columnName(choice.key), type: 'varchar', length: choice.maxLength, nullable: true })(
    ParameterColumns.prototype,
    choice.key,
  );
  for (const parameter of parameters)
    Column({ name: columnName(parameter.key), type: 'double', nullable: canBeUnknown(parameter) })(
      ParameterColumns.prototype,
      parameter.key,
    );
  return ParameterColumns;
}

/** The database's name of a parameter's column: `voltageNoise` → `voltage_noise`. */
export function columnName(key: string): string {
  return key.replace(/[A-Z]/g, (letter) => `_${letter.toLowerCase()}`);
}
