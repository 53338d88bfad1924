import {
  DECIMAL_MARKS,
  type DecimalMark,
  NOT_STATED,
  type RowState,
  type WholeList,
} from '@roothertz/common/imports';
import { ApiProperty } from '@nestjs/swagger';
import { listOf } from '../../shared/list/list-response.js';
import { MemberDto, toMemberDto } from '../../shared/members/member.dto.js';
import type { Import } from '../entities/import.entity.js';
import { type Delimiter, DELIMITERS, type Encoding, ENCODINGS } from '../../shared/csv/csv-format.js';
import type { Dialect } from '../file/dialect.js';
import {
  IMPORT_KINDS,
  IMPORT_STATES,
  type ImportKind,
  type ImportState,
  isRunning,
} from '../import-states.js';
import type { RowCounts } from '../row-counts.js';
import { ColumnMappingDto } from './map-import.dto.js';

class DialectDto implements Dialect {
  @ApiProperty({ enum: ENCODINGS })
  encoding: Encoding;

  @ApiProperty()
  byteOrderMark: boolean;

  @ApiProperty({ enum: DELIMITERS })
  delimiter: Delimiter;

  @ApiProperty({ enum: DECIMAL_MARKS })
  decimalMark: DecimalMark;

  @ApiProperty({ type: 'integer', description: 'The line on which the headings stand, from 1.' })
  headerLine: number;
}

class RowCountsDto implements Record<RowState, number> {
  @ApiProperty({ type: 'integer' })
  new: number;

  @ApiProperty({ type: 'integer' })
  changed: number;

  @ApiProperty({ type: 'integer' })
  unchanged: number;

  @ApiProperty({ type: 'integer', description: 'Accepted, with a caution.' })
  doubtful: number;

  @ApiProperty({ type: 'integer' })
  refused: number;
}

class ImportProgressDto {
  @ApiProperty({ type: 'integer' })
  done: number;

  @ApiProperty({ type: 'integer' })
  total: number;

  @ApiProperty({ type: Number, nullable: true, description: 'Null = too early to tell.' })
  rowsPerSecond: number | null;

  @ApiProperty({ type: Number, nullable: true })
  secondsLeft: number | null;
}

/** An import as the history lists it. */
export class ImportSummaryDto {
  @ApiProperty()
  id: string;

  @ApiProperty({ enum: IMPORT_KINDS })
  kind: ImportKind;

  @ApiProperty({ enum: IMPORT_STATES })
  state: ImportState;

  @ApiProperty()
  fileName: string;

  @ApiProperty({ type: 'integer', description: 'Bytes' })
  fileSize: number;

  @ApiProperty({ type: 'integer' })
  rowCount: number;

  @ApiProperty({ type: RowCountsDto, nullable: true, description: 'Null = the rows aren’t checked.' })
  counts: RowCounts | null;

  @ApiProperty({ type: 'integer', description: 'Rows that an undoing left, for they were edited since.' })
  keptCount: number;

  @ApiProperty({ type: ImportProgressDto, nullable: true, description: 'Null = nobody is at work on it.' })
  progress: ImportProgressDto | null;

  @ApiProperty({ type: String, nullable: true, description: 'Why the last work ended without a result.' })
  failure: string | null;

  @ApiProperty({ type: String, format: 'date-time' })
  createdAt: string;

  @ApiProperty({ type: MemberDto, nullable: true })
  createdBy: MemberDto | null;

  @ApiProperty({ type: String, format: 'date-time', nullable: true })
  appliedAt: string | null;

  @ApiProperty({ type: MemberDto, nullable: true })
  appliedBy: MemberDto | null;

  @ApiProperty({ type: String, format: 'date-time', nullable: true })
  undoneAt: string | null;

  @ApiProperty({ type: MemberDto, nullable: true })
  undoneBy: MemberDto | null;
}

class ColumnProposalDto extends ColumnMappingDto {
  @ApiProperty({ description: 'From 0 to 1; 1 = the heading is a name that the catalogue knows.' })
  confidence: number;

  @ApiProperty({ description: 'The file names no unit.' })
  unitAssumed: boolean;
}

class ImportColumnDto {
  @ApiProperty({ type: 'integer' })
  column: number;

  @ApiProperty()
  heading: string;

  @ApiProperty({ type: [String], description: 'The first cells under the heading.' })
  samples: string[];

  @ApiProperty({ type: ColumnProposalDto, nullable: true })
  proposed: ColumnProposalDto | null;
}

class StatedOfListDto implements WholeList {
  @ApiProperty({ type: String, nullable: true })
  supplier: string | null;

  @ApiProperty({ type: String, nullable: true })
  currency: string | null;
}

class SameFileDto {
  @ApiProperty()
  id: string;

  @ApiProperty({ enum: IMPORT_STATES })
  state: ImportState;

  @ApiProperty({ type: String, format: 'date-time' })
  createdAt: string;
}

/** An import with all that its page shows. */
export class ImportResponseDto extends ImportSummaryDto {
  @ApiProperty()
  dialect: DialectDto;

  @ApiProperty({ type: [ImportColumnDto] })
  columns: ImportColumnDto[];

  @ApiProperty({ type: [ColumnMappingDto], nullable: true, description: 'Null = not said yet.' })
  mapping: ColumnMappingDto[] | null;

  @ApiProperty({ description: 'What holds for all rows of a price list that has no column for it.' })
  wholeList: StatedOfListDto;

  @ApiProperty({ type: 'integer', description: 'Goes up with each change of dialect or columns.' })
  version: number;

  @ApiProperty({
    type: [ColumnMappingDto],
    nullable: true,
    description: 'What the team said of a list with the same headings the last time.',
  })
  rememberedMapping: ColumnMappingDto[] | null;

  @ApiProperty({ type: SameFileDto, nullable: true, description: 'The very same file was uploaded before.' })
  sameFile: SameFileDto | null;
}

export class ImportListDto extends listOf(ImportSummaryDto) {}

export function toImportSummary(entity: Import): ImportSummaryDto {
  const { id, kind, state, fileName, fileSize, rowCount, counts, keptCount, failure } = entity;
  return {
    id: String(id),
    kind,
    state,
    fileName,
    fileSize,
    rowCount,
    counts,
    keptCount,
    progress: progressOf(entity),
    failure,
    createdAt: entity.createdAt.toISOString(),
    createdBy: toMemberDto(entity.createdBy),
    appliedAt: entity.appliedAt?.toISOString() ?? null,
    appliedBy: toMemberDto(entity.appliedBy),
    undoneAt: entity.undoneAt?.toISOString() ?? null,
    undoneBy: toMemberDto(entity.undoneBy),
  };
}

export function toImportResponse(
  entity: Import,
  beside: Pick<ImportResponseDto, 'rememberedMapping' | 'sameFile'>,
): ImportResponseDto {
  const { dialect, columns, mapping, version } = entity;
  const wholeList = entity.wholeList ?? NOT_STATED;
  return { ...toImportSummary(entity), dialect, columns, mapping, wholeList, version, ...beside };
}

export function toSameFile({ id, state, createdAt }: Import): SameFileDto {
  return { id: String(id), state, createdAt: createdAt.toISOString() };
}

function progressOf({ state, progress: { done, total, since } }: Import): ImportProgressDto | null {
  if (!isRunning(state)) return null;
  const seconds = (Date.now() - (since?.getTime() ?? Date.now())) / 1000;
  const rate = seconds > 0 && done > 0 ? done / seconds : null;
  return {
    done,
    total,
    rowsPerSecond: rate,
    secondsLeft: rate && Math.max(0, total - done) / rate,
  };
}
