import { Column, Entity, PrimaryColumn } from 'typeorm';

/** How often something was asked for since its minute began. It stands in the server's memory: a restart may forget it. */
@Entity('request_counts', { engine: 'MEMORY' })
export class RequestCount {
  /** Who asks for what, as a hash in hexadecimal digits. */
  @PrimaryColumn({ name: 'request_hash', type: 'char', length: 64, collation: 'ascii_bin', charset: 'ascii' })
  hash: string;

  @Column({ type: 'int', unsigned: true })
  count: number;

  /** When it is counted from nothing again, by the database's clock. */
  @Column({ type: 'datetime', precision: 3 })
  until: Date;
}
