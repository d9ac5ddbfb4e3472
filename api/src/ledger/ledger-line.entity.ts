import { Column, Entity, PrimaryColumn } from 'typeorm';

/** One line of a sheet's ledger. The database refuses every change, and every line that follows no other. */
@Entity('ledger_lines')
export class LedgerLineEntity {
  @PrimaryColumn('uuid', { name: 'sheet_id' })
  sheetId!: string;

  @PrimaryColumn('int')
  seq!: number;

  @Column('uuid', { name: 'shop_id' })
  shopId!: string;

  @Column('text', { name: 'prev_hash' })
  prevHash!: string;

  /** SHA-256 over the hash of the line before and the body. */
  @Column('text')
  hash!: string;

  /** Canonical JSON (RFC 8785), as it was hashed. */
  @Column('text')
  body!: string;

  @Column('timestamptz')
  at!: Date;
}
