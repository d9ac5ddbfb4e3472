import { Column, Entity, PrimaryColumn } from 'typeorm';
import type { Quantity } from '@second-spanner/shared/contracts/quantity';
import type { ToolKind } from '@second-spanner/shared/contracts/registers';

@Entity('tools')
export class ToolEntity {
  @PrimaryColumn('uuid')
  id!: string;

  @Column('uuid', { name: 'shop_id' })
  shopId!: string;

  @Column('text')
  code!: string;

  @Column('text')
  name!: string;

  @Column('text')
  kind!: ToolKind;

  @Column('jsonb')
  low!: Quantity;

  @Column('jsonb')
  high!: Quantity;

  @Column('jsonb')
  resolution!: Quantity;

  @Column('jsonb', { nullable: true })
  uncertainty!: Quantity | null;

  @Column('double precision', { name: 'uncertainty_share', nullable: true })
  uncertaintyShare!: number | null;

  @Column('jsonb', { nullable: true })
  length!: Quantity | null;

  /** ISO date. */
  @Column('date', { name: 'calibration_due' })
  calibrationDue!: string;
}
