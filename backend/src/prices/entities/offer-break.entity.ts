import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { Offer } from './offer.entity.js';

@Entity('price_breaks')
export class OfferBreak {
  @PrimaryColumn({ name: 'offer_id', type: 'int', unsigned: true })
  offerId: number;

  @ManyToOne(() => Offer, ({ breaks }) => breaks, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'offer_id', foreignKeyConstraintName: 'price_breaks_offer' })
  offer: Relation<Offer>;

  @PrimaryColumn({ name: 'minimum_quantity', type: 'int', unsigned: true })
  minimumQuantity: number;

  @Column({ name: 'unit_price', type: 'decimal', precision: 18, scale: 6 })
  unitPrice: string;
}
