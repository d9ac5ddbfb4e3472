import { Column, Entity, PrimaryColumn } from 'typeorm';
import type { Dialect, Role } from '@second-spanner/shared/contracts/people';

@Entity('people')
export class PersonEntity {
  @PrimaryColumn('uuid')
  id!: string;

  @Column('uuid', { name: 'shop_id' })
  shopId!: string;

  @Column('text')
  name!: string;

  @Column('text')
  email!: string;

  @Column('text')
  role!: Role;

  /** Null follows the shop. */
  @Column('text', { nullable: true })
  dialect!: Dialect | null;

  @Column('text', { name: 'password_hash', select: false })
  passwordHash!: string;

  @Column('timestamptz', { name: 'locked_at', nullable: true })
  lockedAt!: Date | null;
}
