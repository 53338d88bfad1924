import {
  Column,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  OneToMany,
  PrimaryGeneratedColumn,
  type Relation,
} from 'typeorm';
import { Part } from '../../library/entities/part.entity.js';
import { Team } from '../../teams/entities/team.entity.js';
import { User } from '../../users/entities/user.entity.js';
import { OfferBreak } from './offer-break.entity.js';
import { Supplier } from './supplier.entity.js';

/** An offer in one state of its terms: what changes them closes it and opens the next. */
@Entity('offers')
@Index('offers_open', ['teamId', 'closedAt', 'partId'])
@Index('offers_history', ['teamId', 'partId', 'openedAt'])
export class Offer {
  @PrimaryGeneratedColumn({ unsigned: true })
  id: number;

  @Column({ name: 'team_id', type: 'int', unsigned: true })
  teamId: number;

  @ManyToOne(() => Team, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'team_id', foreignKeyConstraintName: 'offers_team' })
  team: Relation<Team>;

  @Column({ name: 'part_id', type: 'int', unsigned: true })
  partId: number;

  @ManyToOne(() => Part, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'part_id', foreignKeyConstraintName: 'offers_part' })
  part: Relation<Part>;

  @Column({ name: 'supplier_id', type: 'int', unsigned: true })
  supplierId: number;

  @ManyToOne(() => Supplier, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'supplier_id', foreignKeyConstraintName: 'offers_supplier' })
  supplier: Relation<Supplier>;

  @Column({ name: 'supplier_number', type: 'varchar', length: 60 })
  supplierNumber: string;

  @Column({ type: 'char', length: 3 })
  currency: string;

  @OneToMany(() => OfferBreak, ({ offer }) => offer)
  breaks: Relation<OfferBreak>[];

  @Column({ name: 'minimum_order_quantity', type: 'int', unsigned: true })
  minimumOrderQuantity: number;

  @Column({ name: 'order_multiple', type: 'int', unsigned: true })
  orderMultiple: number;

  @Column({ name: 'lead_time_days', type: 'int', unsigned: true, nullable: true })
  leadTimeDays: number | null;

  @Column({ type: 'int', unsigned: true, nullable: true })
  stock: number | null;

  @Column({ name: 'valid_from', type: 'date', utc: true })
  validFrom: string;

  @Column({ name: 'valid_until', type: 'date', utc: true, nullable: true })
  validUntil: string | null;

  @Column({ name: 'confirmed_at', type: 'datetime', precision: 3 })
  confirmedAt: Date;

  @Column({ name: 'confirmed_by', type: 'int', unsigned: true, nullable: true })
  confirmedById: number | null;

  @ManyToOne(() => User, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'confirmed_by', foreignKeyConstraintName: 'offers_confirmed_by' })
  confirmedBy: Relation<User> | null;

  /** The confirmation before the last one, which takes its place again when that is taken back. */
  @Column({ name: 'earlier_confirmed_at', type: 'datetime', precision: 3, nullable: true })
  earlierConfirmedAt: Date | null;

  @Column({ name: 'earlier_confirmed_by', type: 'int', unsigned: true, nullable: true })
  earlierConfirmedById: number | null;

  @ManyToOne(() => User, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'earlier_confirmed_by', foreignKeyConstraintName: 'offers_earlier_confirmed_by' })
  earlierConfirmedBy: Relation<User> | null;

  /** Goes up by one from each state of the offer to the next. */
  @Column({ type: 'int', unsigned: true, default: 1 })
  version: number;

  @Column({ name: 'opened_at', type: 'datetime', precision: 3 })
  openedAt: Date;

  @Column({ name: 'opened_by', type: 'int', unsigned: true, nullable: true })
  openedById: number | null;

  @ManyToOne(() => User, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'opened_by', foreignKeyConstraintName: 'offers_opened_by' })
  openedBy: Relation<User> | null;

  @Column({ name: 'closed_at', type: 'datetime', precision: 3, nullable: true })
  closedAt: Date | null;

  @Column({ name: 'closed_by', type: 'int', unsigned: true, nullable: true })
  closedById: number | null;

  @ManyToOne(() => User, { onDelete: 'SET NULL' })
  @JoinColumn({ name: 'closed_by', foreignKeyConstraintName: 'offers_closed_by' })
  closedBy: Relation<User> | null;
}
