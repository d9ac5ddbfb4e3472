import { Column, Entity, PrimaryColumn } from 'typeorm';

/** A stored photo. The file itself lies in the store under the same id. */
@Entity('files')
export class StoredFileEntity {
  @PrimaryColumn('uuid')
  id!: string;

  @Column('uuid', { name: 'shop_id' })
  shopId!: string;

  @Column('text', { name: 'media_type' })
  mediaType!: string;

  @Column('int')
  width!: number;

  @Column('int')
  height!: number;

  @Column('int')
  bytes!: number;

  @Column('text')
  sha256!: string;

  @Column('uuid', { name: 'uploaded_by' })
  uploadedBy!: string;

  @Column('timestamptz', { name: 'uploaded_at' })
  uploadedAt!: Date;
}
