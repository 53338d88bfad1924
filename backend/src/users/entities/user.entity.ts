import { Column, CreateDateColumn, Entity, Index, PrimaryGeneratedColumn } from 'typeorm';

@Entity('users')
@Index('users_email', ['email'], { unique: true })
export class User {
  @PrimaryGeneratedColumn({ unsigned: true })
  id: number;

  /** In lower case. */
  @Column({ type: 'varchar', length: 254, collation: 'utf8mb4_bin' })
  email: string;

  @Column({ type: 'varchar', length: 120 })
  name: string;

  @Column({ name: 'password_hash', type: 'varchar', length: 100, collation: 'utf8mb4_bin' })
  passwordHash: string;

  @CreateDateColumn({
    name: 'created_at',
    type: 'datetime',
    precision: 3,
    default: () => 'CURRENT_TIMESTAMP(3)',
  })
  createdAt: Date;
}
