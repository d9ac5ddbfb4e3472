import { Column, Entity, PrimaryColumn } from 'typeorm';
import type { EditionState, SpecDocument } from '@second-spanner/shared/contracts/spec';

/** An edition is kept whole. Once it is approved the database refuses every change of it. */
@Entity('spec_editions')
export class SpecEditionEntity {
  @PrimaryColumn('uuid')
  id!: string;

  @Column('uuid', { name: 'shop_id' })
  shopId!: string;

  @Column('uuid', { name: 'spec_id' })
  specId!: string;

  @Column('int')
  edition!: number;

  @Column('text')
  state!: EditionState;

  @Column('jsonb')
  document!: SpecDocument;

  /** SHA-256 over the document's canonical JSON (RFC 8785). */
  @Column('text')
  hash!: string;

  @Column('int', { name: 'value_count' })
  valueCount!: number;

  @Column('text', { name: 'rests_on' })
  restsOn!: string;

  @Column('uuid', { name: 'approved_by', nullable: true })
  approvedBy!: string | null;

  @Column('timestamptz', { name: 'approved_at', nullable: true })
  approvedAt!: Date | null;
}

/** An edition as lists show it. */
export interface EditionRow {
  readonly id: string;
  readonly specId: string;
  readonly edition: number;
  readonly state: EditionState;
  readonly valueCount: number;
  readonly approverName: string | null;
  readonly approvedAt: Date | null;
  readonly restsOn: string;
  readonly hash: string;
}

/** An edition whole, with its spec's name. */
export type WholeEditionRow = EditionRow & {
  readonly code: string;
  readonly title: string;
  readonly document: SpecDocument;
};
