import { Column, Entity, PrimaryColumn } from 'typeorm';

/** A working kept with a car: what was typed, and who kept it. */
@Entity('kept_workings')
export class KeptWorkingEntity {
  @PrimaryColumn('uuid')
  id!: string;

  @Column('uuid', { name: 'shop_id' })
  shopId!: string;

  @Column('uuid', { name: 'car_id' })
  carId!: string;

  /** Key of the working. */
  @Column('text')
  working!: string;

  @Column('text')
  title!: string;

  @Column('jsonb')
  typed!: Readonly<Record<string, string>>;

  @Column('uuid', { name: 'kept_by' })
  keptBy!: string;

  @Column('timestamptz', { name: 'kept_at' })
  keptAt!: Date;
}

/** A kept working with the name of who kept it. */
export interface KeptWorkingRow {
  readonly id: string;
  readonly carId: string;
  readonly working: string;
  readonly title: string;
  readonly typed: Readonly<Record<string, string>>;
  readonly keptByName: string;
  readonly keptAt: Date;
}
