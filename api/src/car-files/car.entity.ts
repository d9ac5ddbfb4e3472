import { Column, Entity, PrimaryColumn } from 'typeorm';

@Entity('cars')
export class CarEntity {
  @PrimaryColumn('uuid')
  id!: string;

  @Column('uuid', { name: 'shop_id' })
  shopId!: string;

  @Column('text')
  code!: string;

  @Column('text')
  name!: string;

  @Column('int')
  year!: number;

  @Column('text', { name: 'engine_code' })
  engineCode!: string;

  @Column('text', { name: 'engine_number' })
  engineNumber!: string;

  @Column('text', { name: 'chassis_number' })
  chassisNumber!: string;

  @Column('text', { nullable: true })
  registration!: string | null;

  @Column('text', { nullable: true })
  colour!: string | null;

  @Column('text')
  notes!: string;

  /** The owner's account, where they have one. */
  @Column('uuid', { name: 'owner_id', nullable: true })
  ownerId!: string | null;

  @Column('text', { name: 'owner_name', nullable: true })
  ownerName!: string | null;
}

/** A car as lists show it. */
export interface CarRow {
  readonly id: string;
  readonly code: string;
  readonly name: string;
  readonly year: number;
  readonly engineCode: string;
  readonly engineNumber: string;
  readonly ownerName: string | null;
  readonly sheetCount: number;
  readonly chassisNumber: string;
  readonly registration: string | null;
  readonly colour: string | null;
  readonly notes: string;
}
