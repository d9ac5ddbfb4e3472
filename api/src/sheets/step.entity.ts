import { Column, Entity, PrimaryColumn } from 'typeorm';
import type { SecondCheckKind, StepDefinition, StepKind } from '@second-spanner/shared/contracts/steps';
import type { Verdict } from '@second-spanner/shared/contracts/verdict';

/** A step of a sheet: what it asks for, frozen, and what is counted of its records. */
@Entity('steps')
export class StepEntity {
  @PrimaryColumn('uuid')
  id!: string;

  @Column('uuid', { name: 'shop_id' })
  shopId!: string;

  @Column('uuid', { name: 'sheet_id' })
  sheetId!: string;

  @Column('int')
  position!: number;

  @Column('text')
  code!: string;

  @Column('int')
  stage!: number;

  @Column('text')
  kind!: StepKind;

  @Column('text')
  title!: string;

  @Column('boolean')
  hold!: boolean;

  @Column('boolean')
  critical!: boolean;

  @Column('text', { name: 'second_check', nullable: true })
  secondCheck!: SecondCheckKind | null;

  @Column('text', { name: 'rests_on', array: true })
  restsOn!: string[];

  /** Whole and long; only read for the step at hand. */
  @Column('jsonb', { select: false })
  definition!: StepDefinition;

  @Column('text', { name: 'uncritical_reason', nullable: true })
  uncriticalReason!: string | null;

  @Column('int')
  round!: number;

  @Column('int', { name: 'entries_from_round' })
  entriesFromRound!: number;

  @Column('int')
  done!: number;

  @Column('int', { name: 'of_total' })
  of!: number;

  @Column('text', { nullable: true })
  verdict!: Verdict | null;

  @Column('uuid', { name: 'recorder_ids', array: true })
  recorderIds!: string[];

  @Column('boolean')
  countersigned!: boolean;

  @Column('int', { name: 'open_snags' })
  openSnags!: number;

  /** What the step waits for from a person, and since when. */
  @Column('text', { nullable: true })
  awaiting!: 'second-check' | 'snag' | null;

  @Column('timestamptz', { name: 'awaiting_since', nullable: true })
  awaitingSince!: Date | null;
}

/** A step as the sheet's list shows it, without its definition. */
export type StepRow = Omit<StepEntity, 'shopId' | 'sheetId' | 'definition'>;
