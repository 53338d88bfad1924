import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { User } from '../../users/entities/user.entity.js';

/** A kind of notice that a member doesn't want. */
@Entity('refused_mails')
export class RefusedMail {
  @PrimaryColumn({ name: 'user_id', type: 'int', unsigned: true })
  userId: number;

  @ManyToOne(() => User, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'user_id', foreignKeyConstraintName: 'refused_mails_user' })
  user: Relation<User>;

  @PrimaryColumn({ type: 'varchar', length: 40 })
  kind: string;

  @Column({ type: 'datetime', precision: 3 })
  at: Date;
}
