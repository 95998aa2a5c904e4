import { Field, Float, ID, ObjectType } from '@nestjs/graphql';
import { Column, CreateDateColumn, Entity, PrimaryGeneratedColumn } from 'typeorm';

/** A file as it was brought, unchanged; its bytes lie in the store under `storageKey`. */
@Entity({ name: 'files' })
@ObjectType('OriginalFile', { description: 'A file as it was brought, unchanged; its bytes are at /api/files/{id}.' })
export class StoredUpload {
  @PrimaryGeneratedColumn('uuid', { primaryKeyConstraintName: 'pk_files' })
  @Field(() => ID)
  id: string;

  /** as the person called it, for display and for the download */
  @Column('text')
  @Field()
  name: string;

  @Column('text', { name: 'media_type' })
  mediaType: string;

  /** PostgreSQL's bigint comes as text. */
  @Column('bigint', { name: 'size_bytes' })
  @Field(() => Float, { description: 'bytes' })
  sizeBytes: string;

  /** lower-case hex */
  @Column('char', { length: 64 })
  @Field({ description: 'Lower-case hex.' })
  sha256: string;

  @Column('text', { name: 'storage_key' })
  storageKey: string;

  @Column('uuid', { name: 'uploaded_by_id' })
  uploadedById: string;

  @CreateDateColumn({ name: 'created_at', type: 'timestamptz' })
  createdAt: Date;
}
