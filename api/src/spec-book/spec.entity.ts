import { Column, Entity, PrimaryColumn } from 'typeorm';

@Entity('specs')
export class SpecEntity {
  @PrimaryColumn('uuid')
  id!: string;

  @Column('uuid', { name: 'shop_id' })
  shopId!: string;

  @Column('text')
  code!: string;

  @Column('text')
  title!: string;
}
