import { Column, Entity, JoinColumn, OneToOne, PrimaryColumn, type Relation } from 'typeorm';
import type { Import } from './import.entity.js';

/** How far the work on an import is: apart from it, so that it can be noted while the work holds the import. */
@Entity('import_progress')
export class ImportProgress {
  @PrimaryColumn({ name: 'import_id', type: 'int', unsigned: true })
  importId: number;

  @OneToOne('Import', 'progress', { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'import_id', foreignKeyConstraintName: 'import_progress_import' })
  import: Relation<Import>;

  @Column({ type: 'int', unsigned: true, default: 0 })
  done: number;

  @Column({ type: 'int', unsigned: true, default: 0 })
  total: number;

  @Column({ type: 'datetime', precision: 3, nullable: true })
  since: Date | null;

  /** The user who wants the work to stop; null = nobody. */
  @Column({ name: 'cancelled_by', type: 'int', unsigned: true, nullable: true })
  cancelledById: number | null;
}
