import { Column, Entity, PrimaryColumn } from 'typeorm';
import type { SheetState } from '@second-spanner/shared/contracts/sheets';

/** One engine's assembly. What is counted of its steps stands beside it, so that lists need not look at them. */
@Entity('sheets')
export class SheetEntity {
  @PrimaryColumn('uuid')
  id!: string;

  @Column('uuid', { name: 'shop_id' })
  shopId!: string;

  @Column('text')
  code!: string;

  @Column('text')
  state!: SheetState;

  /** Rises with every change. */
  @Column('int')
  version!: number;

  /** Signatures of an older round no longer count: the sheet was sent back. */
  @Column('int', { name: 'sign_round' })
  signRound!: number;

  @Column('uuid', { name: 'car_id' })
  carId!: string;

  @Column('uuid', { name: 'spec_edition_id' })
  specEditionId!: string;

  @Column('uuid', { name: 'builder_id' })
  builderId!: string;

  @Column('uuid', { name: 'countersigner_id' })
  countersignerId!: string;

  @Column('uuid', { name: 'created_by' })
  createdBy!: string;

  @Column('timestamptz', { name: 'created_at' })
  createdAt!: Date;

  @Column('timestamptz', { name: 'changed_at' })
  changedAt!: Date;

  @Column('int', { name: 'steps_done' })
  stepsDone!: number;

  @Column('int', { name: 'steps_total' })
  stepsTotal!: number;

  @Column('int', { name: 'open_snags' })
  openSnags!: number;

  @Column('text', { name: 'next_step', nullable: true })
  nextStep!: string | null;

  @Column('text', { name: 'content_hash', nullable: true })
  contentHash!: string | null;

  @Column('text', { name: 'verification_code', nullable: true })
  verificationCode!: string | null;

  /** The whole sheet as it was released; only read where it is asked for. */
  @Column('jsonb', { nullable: true, select: false })
  frozen!: object | null;

  @Column('timestamptz', { name: 'released_at', nullable: true })
  releasedAt!: Date | null;
}
