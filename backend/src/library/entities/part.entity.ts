import type { Approval, Lifecycle, PartKind } from '@roothertz/common/parts';
import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryGeneratedColumn, type Relation } from 'typeorm';
import { User } from '../../users/entities/user.entity.js';
import { Library } from './library.entity.js';

@Entity('parts')
@Index('parts_key', ['libraryId', 'normalisedKey'], { unique: true })
@Index('parts_name', ['libraryId', 'manufacturer', 'partNumber'])
export class Part {
  @PrimaryGeneratedColumn({ unsigned: true })
  id: number;

  @Column({ name: 'library_id', type: 'int', unsigned: true })
  libraryId: number;

  @ManyToOne(() => Library, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'library_id', foreignKeyConstraintName: 'parts_library' })
  library: Relation<Library>;

  @Column({ type: 'varchar', length: 20 })
  kind: PartKind;

  @Column({ type: 'varchar', length: 120 })
  manufacturer: string;

  @Column({ name: 'part_number', type: 'varchar', length: 120 })
  partNumber: string;

  /** What makes it the same part however its name is written; folding can make 120 characters 360. */
  @Column({ name: 'normalised_key', type: 'varchar', length: 730, collation: 'utf8mb4_bin' })
  normalisedKey: string;

  @Column({ type: 'varchar', length: 1000 })
  description: string;

  @Column({ type: 'varchar', length: 60 })
  package: string;

  @Column({ type: 'varchar', length: 20 })
  lifecycle: Lifecycle;

  @Column({ type: 'varchar', length: 20 })
  approval: Approval;

  @Column({ type: 'int', unsigned: true, default: 1 })
  version: number;

  @Column({ name: 'created_at', type: 'datetime', precision: 3 })
  createdAt: Date;

  @Column({ name: 'updated_at', type: 'datetime', precision: 3 })
  updatedAt: Date;

  @Column({ name: 'updated_by', type: 'int', unsigned: true, nullable: true })
  updatedBy: number | null;

  @ManyToOne(() => User, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'updated_by', foreignKeyConstraintName: 'parts_updated_by' })
  updatedByUser: Relation<User> | null;
}
