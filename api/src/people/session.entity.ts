import { Column, Entity, PrimaryColumn } from 'typeorm';
import type { Session } from '@second-spanner/shared/contracts/people';

export type EndReason = 'signed-out' | 'token-reused';

/** One sign-in on one device: a family of renewal tokens, of which only the newest counts. */
@Entity('sessions')
export class SessionEntity {
  @PrimaryColumn('uuid')
  id!: string;

  @Column('uuid', { name: 'shop_id' })
  shopId!: string;

  @Column('uuid', { name: 'person_id' })
  personId!: string;

  /** SHA-256 of the newest token. */
  @Column('text', { name: 'token_hash' })
  tokenHash!: string;

  @Column('timestamptz', { name: 'renewed_at' })
  renewedAt!: Date;

  @Column('timestamptz', { name: 'expires_at' })
  expiresAt!: Date;

  @Column('timestamptz', { name: 'ended_at', nullable: true })
  endedAt!: Date | null;

  @Column('text', { name: 'end_reason', nullable: true })
  endReason!: EndReason | null;
}

/** A running session with its person and shop, in one row. */
export type SessionRow = Session['person'] & {
  readonly sessionId: string;
  readonly shopName: string;
  readonly shopDialect: Session['shop']['dialect'];
  readonly shopDemo: boolean;
};
