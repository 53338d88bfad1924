import type { ColumnMapping, WholeList } from '@roothertz/common/imports';
import {
  Column,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  OneToOne,
  PrimaryGeneratedColumn,
  type Relation,
} from 'typeorm';
import { Team } from '../../teams/entities/team.entity.js';
import { User } from '../../users/entities/user.entity.js';
import type { Dialect } from '../file/dialect.js';
import type { ImportColumn } from '../file/import-columns.js';
import type { ImportKind, ImportState } from '../import-states.js';
import type { RowCounts } from '../row-counts.js';
import { ImportProgress } from './import-progress.entity.js';

/** An uploaded list and what has become of it: the team's history of imports. */
@Entity('imports')
@Index('imports_file', ['teamId', 'sha256'])
@Index('imports_header', ['teamId', 'headerKey'])
export class Import {
  @PrimaryGeneratedColumn({ unsigned: true })
  id: number;

  @Column({ name: 'team_id', type: 'int', unsigned: true })
  teamId: number;

  @ManyToOne(() => Team, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'team_id', foreignKeyConstraintName: 'imports_team' })
  team: Relation<Team>;

  @Column({ type: 'varchar', length: 20 })
  kind: ImportKind;

  @Column({ type: 'varchar', length: 20 })
  state: ImportState;

  @Column({ name: 'file_name', type: 'varchar', length: 255 })
  fileName: string;

  @Column({ name: 'file_size', type: 'int', unsigned: true })
  fileSize: number;

  /** The file's name in the directory of uploads; null = it isn't kept any more. */
  @Column({ name: 'stored_name', type: 'varchar', length: 64, collation: 'utf8mb4_bin', nullable: true })
  storedName: string | null;

  @Column({ type: 'varchar', length: 64, collation: 'utf8mb4_bin' })
  sha256: string;

  /** The same for lists of the same headings, however their case and punctuation. */
  @Column({ name: 'header_key', type: 'varchar', length: 64, collation: 'utf8mb4_bin' })
  headerKey: string;

  @Column({ type: 'json' })
  dialect: Dialect;

  @Column({ type: 'json' })
  columns: ImportColumn[];

  @Column({ type: 'json', nullable: true })
  mapping: ColumnMapping[] | null;

  /** What was said of all rows; null = nothing. */
  @Column({ name: 'whole_list', type: 'json', nullable: true })
  wholeList: WholeList | null;

  /** Goes up by one with each change of dialect, columns or what holds for the whole list. */
  @Column({ type: 'int', unsigned: true, default: 1 })
  version: number;

  @Column({ name: 'row_count', type: 'int', unsigned: true })
  rowCount: number;

  /** Null = the rows aren't checked. */
  @Column({ type: 'json', nullable: true })
  counts: RowCounts | null;

  /** How many rows an undoing left as they are, for they were edited since. */
  @Column({ name: 'kept_count', type: 'int', unsigned: true, default: 0 })
  keptCount: number;

  /** The library's revision when the rows were checked. */
  @Column({ name: 'checked_revision', type: 'int', unsigned: true, nullable: true })
  checkedRevision: number | null;

  @OneToOne(() => ImportProgress, ({ import: owner }) => owner)
  progress: Relation<ImportProgress>;

  @Column({ type: 'varchar', length: 500, nullable: true })
  failure: string | null;

  @Column({ name: 'created_at', type: 'datetime', precision: 3 })
  createdAt: Date;

  @Column({ name: 'created_by', type: 'int', unsigned: true, nullable: true })
  createdById: number | null;

  @ManyToOne(() => User, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'created_by', foreignKeyConstraintName: 'imports_created_by' })
  createdBy: Relation<User> | null;

  /** The very moment that the written parts carry. */
  @Column({ name: 'applied_at', type: 'datetime', precision: 3, nullable: true })
  appliedAt: Date | null;

  @Column({ name: 'applied_by', type: 'int', unsigned: true, nullable: true })
  appliedById: number | null;

  @ManyToOne(() => User, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'applied_by', foreignKeyConstraintName: 'imports_applied_by' })
  appliedBy: Relation<User> | null;

  @Column({ name: 'undone_at', type: 'datetime', precision: 3, nullable: true })
  undoneAt: Date | null;

  @Column({ name: 'undone_by', type: 'int', unsigned: true, nullable: true })
  undoneById: number | null;

  @ManyToOne(() => User, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'undone_by', foreignKeyConstraintName: 'imports_undone_by' })
  undoneBy: Relation<User> | null;
}
