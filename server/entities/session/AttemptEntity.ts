import { Column, Entity, PrimaryColumn } from 'typeorm'

/** Attempts of one kind by one account or address within the window that began at `windowStart`. */
@Entity('attempt')
export class AttemptEntity {
  /** SHA-256 of kind and subject, hexadecimal. */
  @PrimaryColumn({ type: 'char', length: 64 }) subject: string
  @Column({ name: 'window_start', type: 'datetime', precision: 6 }) windowStart: Date
  @Column({ type: 'int', unsigned: true }) count: number
}
