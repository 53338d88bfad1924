import type { Doubt, FieldChange, RowError, RowState } from '@roothertz/common/imports';
import type { LibraryPart } from '@roothertz/common/parts';
import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { Import } from './import.entity.js';

/** A row of an uploaded list with its verdict; what is to be written and what stood before is kept in it. */
@Entity('import_rows')
@Index('import_rows_state', ['importId', 'state'])
export class ImportRow {
  @PrimaryColumn({ name: 'import_id', type: 'int', unsigned: true })
  importId: number;

  @ManyToOne(() => Import, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'import_id', foreignKeyConstraintName: 'import_rows_import' })
  import: Relation<Import>;

  /** The row's place among the rows, from 1. */
  @PrimaryColumn({ type: 'int', unsigned: true })
  position: number;

  /** The line of the file on which it begins. */
  @Column({ type: 'int', unsigned: true })
  line: number;

  @Column({ type: 'varchar', length: 10, collation: 'utf8mb4_bin' })
  state: RowState;

  @Column({ type: 'varchar', length: 120 })
  manufacturer: string;

  @Column({ name: 'part_number', type: 'varchar', length: 120 })
  partNumber: string;

  @Column({ name: 'normalised_key', type: 'varchar', length: 730, collation: 'utf8mb4_bin', nullable: true })
  normalisedKey: string | null;

  /** The part that the row changes; null = the row is a new one. */
  @Column({ name: 'part_id', type: 'int', unsigned: true, nullable: true })
  partId: number | null;

  @Column({ name: 'base_version', type: 'int', unsigned: true, nullable: true })
  baseVersion: number | null;

  @Column({ type: 'json', nullable: true })
  content: LibraryPart | null;

  @Column({ name: 'before_image', type: 'json', nullable: true })
  beforeImage: LibraryPart | null;

  @Column({ type: 'json', nullable: true })
  changes: FieldChange[] | null;

  @Column({ type: 'json', nullable: true })
  doubts: Doubt[] | null;

  @Column({ type: 'json', nullable: true })
  errors: RowError[] | null;

  /** The cells of a refused row, for the list that is to be mended. */
  @Column({ type: 'json', nullable: true })
  cells: string[] | null;

  /** An undoing left the part as it is, for it was edited since. */
  @Column({ type: 'tinyint', default: 0 })
  kept: number;
}
