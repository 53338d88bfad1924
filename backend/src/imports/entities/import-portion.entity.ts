import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import type { RowCounts } from '../row-counts.js';
import type { StoredRow } from '../stored-row.js';
import { Import } from './import.entity.js';

/** Some hundred rows of an uploaded list with their verdicts: stored together, since a list has many. */
@Entity('import_portions')
export class ImportPortion {
  @PrimaryColumn({ name: 'import_id', type: 'int', unsigned: true })
  importId: number;

  @ManyToOne(() => Import, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'import_id', foreignKeyConstraintName: 'import_portions_import' })
  import: Relation<Import>;

  /** Its place among the portions, from 1. */
  @PrimaryColumn({ name: 'place', type: 'int', unsigned: true })
  portion: number;

  @Column({ type: 'json' })
  counts: RowCounts & { kept: number };

  @Column({ name: 'verdicts', type: 'json' })
  rows: StoredRow[];
}
