import { createHash, randomUUID } from 'node:crypto';
import { type Readable } from 'node:stream';
import { buffer } from 'node:stream/consumers';
import { HttpException, Injectable } from '@nestjs/common';
import { DataSource } from 'typeorm';
import { ApiError } from '../common/api-error.js';
import { isId } from '../common/graphql/node.js';
import { hasRole, isOfTheGroup, type Viewer } from '../common/viewer.js';
import { StorageService } from '../storage/storage.service.js';
import { StoredUpload } from './file.entity.js';
import { DAILY_QUOTA, displayName, mediaTypeOf } from './file-rules.js';

/** The series that a file came with is open to the group once it is submitted. */
const OPEN_TO_THE_GROUP = `SELECT EXISTS (SELECT FROM series WHERE file_id = $1 AND status IN ('SUBMITTED', 'ACCEPTED', 'RETIRED')) AS open`;

/** Originals of what is brought in: kept unchanged, with their SHA-256, for good. */
@Injectable()
export class FilesService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly storage: StorageService,
  ) {}

  /**
   * Keeps a file. The bytes are stored first; a file that is known is a file that is there.
   *
   * @throws {HttpException} 400 when it is empty, 415 when it is neither text nor a workbook
   * @throws {ApiError} RATE_LIMITED when the person's quota for the day is used up
   */
  async keep(name: string, bytes: Buffer, viewer: Viewer): Promise<StoredUpload> {
    if (bytes.length === 0) throw new HttpException({ message: 'The file is empty.', code: 'EMPTY' }, 400);
    const mediaType = mediaTypeOf(bytes);
    if (mediaType === null) {
      const message = 'Only tables are taken: text such as CSV, or a workbook (XLSX). This file holds something else.';
      throw new HttpException({ message, code: 'NOT_A_TABLE' }, 415);
    }
    await this.refuseOverQuota(bytes.length, viewer);
    const storageKey = `uploads/${randomUUID()}`;
    await this.storage.put(storageKey, bytes, mediaType);
    return this.dataSource.getRepository(StoredUpload).save({
      name: displayName(name),
      mediaType,
      sizeBytes: String(bytes.length),
      sha256: createHash('sha256').update(bytes).digest('hex'),
      storageKey,
      uploadedById: viewer.id,
    });
  }

  /** A file the viewer may see: their own, and those of series that are open to the group. */
  async find(id: string, viewer: Viewer): Promise<StoredUpload> {
    const file = isId(id) ? await this.findVisible(id, viewer) : null;
    if (!file) throw new ApiError('NOT_FOUND', 'There is no such file.');
    return file;
  }

  /** The file, or null when there is none the viewer may see. */
  async findVisible(id: string, viewer: Viewer): Promise<StoredUpload | null> {
    const file = await this.dataSource.getRepository(StoredUpload).findOneBy({ id });
    return file && (await this.maySee(file, viewer)) ? file : null;
  }

  async open(file: StoredUpload): Promise<Readable> {
    const stream = await this.storage.get(file.storageKey);
    if (!stream) throw new Error(`the bytes of file ${file.id} are missing from the store`);
    return stream;
  }

  async read(file: StoredUpload): Promise<Buffer> {
    return buffer(await this.open(file));
  }

  /** Takes back a file that was kept for something that was then refused. */
  async takeBack(file: StoredUpload): Promise<void> {
    await this.dataSource.getRepository(StoredUpload).delete(file.id);
    await this.storage.remove(file.storageKey);
  }

  private async maySee(file: StoredUpload, viewer: Viewer): Promise<boolean> {
    if (file.uploadedById === viewer.id || hasRole(viewer, 'EDITOR', 'ADMINISTRATOR')) return true;
    if (!isOfTheGroup(viewer)) return false;
    const [row] = await this.dataSource.query<{ open: boolean }[]>(OPEN_TO_THE_GROUP, [file.id]);
    return row?.open === true;
  }

  private async refuseOverQuota(sizeBytes: number, viewer: Viewer): Promise<void> {
    const [used] = await this.dataSource.query<{ files: number; bytes: number }[]>(
      `SELECT count(*)::int AS files, coalesce(sum(size_bytes), 0)::float8 AS bytes FROM files
       WHERE uploaded_by_id = $1 AND created_at > now() - interval '1 day'`,
      [viewer.id],
    );
    if (!used || (used.files < DAILY_QUOTA.files && used.bytes + sizeBytes <= DAILY_QUOTA.bytes)) return;
    throw new ApiError('RATE_LIMITED', 'That is as much as one person may bring in within a day. Go on tomorrow.');
  }
}
