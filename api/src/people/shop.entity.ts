import { Column, Entity, PrimaryColumn } from 'typeorm';
import type { Dialect } from '@second-spanner/shared/contracts/people';

@Entity('shops')
export class ShopEntity {
  @PrimaryColumn('uuid')
  id!: string;

  @Column('text')
  name!: string;

  @Column('text')
  dialect!: Dialect;

  @Column('boolean')
  demo!: boolean;
}
