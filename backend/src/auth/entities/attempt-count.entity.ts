import { Column, Entity, PrimaryColumn } from 'typeorm';

/** How often something was tried lately, and until when it has to wait. */
@Entity('attempt_counts')
export class AttemptCount {
  /** SHA-256 of what is counted, in hexadecimal digits: addresses of strangers are not kept. */
  @PrimaryColumn({ name: 'subject_hash', type: 'char', length: 64, collation: 'ascii_bin', charset: 'ascii' })
  hash: string;

  @Column({ type: 'int', unsigned: true })
  count: number;

  @Column({ type: 'datetime', precision: 3 })
  until: Date;
}
