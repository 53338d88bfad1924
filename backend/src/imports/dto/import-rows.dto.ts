import {
  type Doubt,
  DOUBT_CODES,
  type DoubtCode,
  type FieldChange,
  type PartValue,
  ROW_STATES,
  type RowState,
} from '@roothertz/common/imports';
import { ApiProperty } from '@nestjs/swagger';
import { ListQueryDto } from '../../shared/list/list-query.dto.js';
import { listOf } from '../../shared/list/list-response.js';
import { Option } from '../../shared/validation/option.decorator.js';
import type { Import } from '../entities/import.entity.js';
import { keptValues } from '../kept-values.js';
import { ROW_LISTS, type RowList, type StoredRow } from '../stored-row.js';

export class ListImportRowsDto extends ListQueryDto {
  @Option(ROW_LISTS, { optional: true })
  state?: RowList;
}

const VALUE = { oneOf: [{ type: 'string' }, { type: 'number' }], nullable: true };

class FieldChangeDto implements FieldChange {
  @ApiProperty({ description: 'Path of the field, such as amplifier.voltageNoise.' })
  field: string;

  @ApiProperty({ ...VALUE, description: 'In SI units; null = unknown.' })
  old: PartValue;

  @ApiProperty({ ...VALUE, description: 'In SI units; null = unknown.' })
  new: PartValue;
}

class DoubtDto implements Doubt {
  @ApiProperty({ enum: DOUBT_CODES })
  code: DoubtCode;

  @ApiProperty({ type: String, nullable: true })
  field: string | null;

  @ApiProperty()
  message: string;
}

class RowErrorDto {
  @ApiProperty({
    type: String,
    nullable: true,
    description: 'The column’s heading; null = the list has none.',
  })
  column: string | null;

  @ApiProperty()
  value: string;

  @ApiProperty()
  why: string;

  @ApiProperty()
  expected: string;
}

export class ImportRowDto {
  @ApiProperty({ type: 'integer', description: 'The line of the file on which the row begins.' })
  line: number;

  @ApiProperty({ enum: ROW_STATES })
  state: RowState;

  @ApiProperty()
  manufacturer: string;

  @ApiProperty()
  partNumber: string;

  @ApiProperty({ type: String, nullable: true, description: 'Whose price it is; null in a list of parts.' })
  supplier: string | null;

  @ApiProperty({ type: [FieldChangeDto], description: 'Of a new row, all that would be kept.' })
  changes: FieldChangeDto[];

  @ApiProperty({ type: [DoubtDto] })
  doubts: DoubtDto[];

  @ApiProperty({ type: [RowErrorDto] })
  errors: RowErrorDto[];

  @ApiProperty({ description: 'An undoing left the part, for it was edited since.' })
  kept: boolean;
}

export class ImportRowListDto extends listOf(ImportRowDto) {}

export function toImportRow(
  row: StoredRow,
  { columns, kind }: Pick<Import, 'columns' | 'kind'>,
): ImportRowDto {
  const { line, state, manufacturer, partNumber, supplier, doubts, errors, kept } = row;
  return {
    line,
    state,
    manufacturer,
    partNumber,
    supplier: supplier ?? null,
    changes: row.changes ?? keptValues(kind, row),
    doubts: doubts ?? [],
    errors: (errors ?? []).map(({ column, value, why, expected }) => ({
      column: column === null ? null : (columns[column]?.heading ?? null),
      value,
      why,
      expected,
    })),
    kept: kept ?? false,
  };
}
