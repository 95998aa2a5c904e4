import { Column, CreateDateColumn, Entity, PrimaryGeneratedColumn } from 'typeorm';

/** A file as it was brought, unchanged; its bytes lie in the store under `storageKey`. */
@Entity({ name: 'files' })
export class StoredUpload {
  @PrimaryGeneratedColumn('uuid', { primaryKeyConstraintName: 'pk_files' })
  id: string;

  /** as the person called it, for display and for the download */
  @Column('text')
  name: string;

  @Column('text', { name: 'media_type' })
  mediaType: string;

  /** PostgreSQL's bigint comes as text. */
  @Column('bigint', { name: 'size_bytes' })
  sizeBytes: string;

  /** lower-case hex */
  @Column('char', { length: 64 })
  sha256: string;

  @Column('text', { name: 'storage_key' })
  storageKey: string;

  @Column('uuid', { name: 'uploaded_by_id' })
  uploadedById: string;

  @CreateDateColumn({ name: 'created_at', type: 'timestamptz' })
  createdAt: Date;
}
