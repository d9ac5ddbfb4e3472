import { Column, Entity, PrimaryColumn } from 'typeorm';
import type { PersonName } from '@second-spanner/shared/contracts/people';
import type { SheetState, SignatureMeaning } from '@second-spanner/shared/contracts/sheets';

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

  /** The stages that it was laid out with: a list of `SheetStage`. */
  @Column('jsonb', { select: false })
  stages!: object;

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

/** A stage as the sheet was laid out with it. */
export interface SheetStage {
  readonly stage: number;
  readonly title: string;
  readonly hold: boolean;
  readonly cautions: readonly string[];
}

/** A sheet as lists show it. */
export interface SheetRow {
  readonly id: string;
  readonly code: string;
  readonly state: SheetState;
  readonly version: number;
  readonly carId: string;
  readonly carName: string;
  readonly engineCode: string;
  readonly specEdition: number;
  readonly builder: PersonName;
  readonly countersigner: PersonName;
  readonly stepsDone: number;
  readonly stepsTotal: number;
  readonly openSnags: number;
  readonly nextStep: string | null;
  readonly changedAt: Date;
}

/** A signature that counts, with who gave it. Times out of JSON are texts. */
export interface SignatureRow {
  readonly meaning: SignatureMeaning;
  readonly person: PersonName;
  readonly at: string;
  readonly binding: string;
  readonly contentHash: string;
}

/** A sheet with everything but its steps. */
export interface WholeSheetRow extends SheetRow {
  readonly signRound: number;
  readonly engineNumber: string;
  readonly ownerName: string | null;
  readonly specId: string;
  readonly specTitle: string;
  readonly specEditionId: string;
  readonly specHash: string;
  readonly contentHash: string | null;
  readonly verificationCode: string | null;
  readonly stages: readonly SheetStage[];
  readonly signatures: readonly SignatureRow[];
}

/** A sheet whose row is locked by the transaction at hand. */
export type LockedSheetRow = Pick<
  WholeSheetRow,
  | ('id' | 'code' | 'state' | 'version' | 'signRound' | 'stepsDone' | 'stepsTotal' | 'openSnags')
  | ('carName' | 'builder' | 'countersigner')
>;
