import { Column, Entity, PrimaryColumn } from 'typeorm';

/** The act and the immutable record: snapshot, hash, place in the chain, people, DOI. The database refuses changes. */
@Entity({ name: 'releases' })
export class Release {
  /** Consecutive over the whole service, from 1. */
  @PrimaryColumn('bigint', { primaryKeyConstraintName: 'pk_releases' })
  sequence: string;

  @Column('uuid', { name: 'version_id' })
  versionId: string;

  /** Lower-case hex SHA-256 of `snapshot`. */
  @Column('character', { name: 'content_hash', length: 64 })
  contentHash: string;

  @Column('character', { name: 'previous_hash', length: 64, nullable: true })
  previousHash: string | null;

  /** Canonical JSON (RFC 8785). */
  @Column('text')
  snapshot: string;

  @Column('text')
  doi: string;

  @Column('uuid', { name: 'released_by_id' })
  releasedById: string;

  @Column('timestamptz', { name: 'released_at' })
  releasedAt: Date;
}
