import { Column, Entity, PrimaryColumn } from 'typeorm';

/** An event of the payment service that was acted upon: its id is taken once, however often it comes. */
@Entity('billing_events')
export class BillingEvent {
  @PrimaryColumn({ type: 'varchar', length: 255, collation: 'utf8mb4_bin' })
  id: string;

  @Column({ type: 'varchar', length: 100 })
  type: string;

  @Column({ name: 'received_at', type: 'datetime', precision: 3 })
  receivedAt: Date;
}
