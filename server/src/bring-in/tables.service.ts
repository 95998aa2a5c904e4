import { Injectable } from '@nestjs/common';
import { LRUCache } from 'lru-cache';
import { ConcurrencyLimit } from '../auth/concurrency-limit.js';
import { ApiError } from '../common/api-error.js';
import { type Viewer } from '../common/viewer.js';
import { MEDIA_TYPE_OF_WORKBOOK } from '../files/file-rules.js';
import { type StoredUpload } from '../files/file.entity.js';
import { FilesService } from '../files/files.service.js';
import { MAX_ROWS } from './limits.js';
import type { ByteSource, DecimalSign, Delimiter, RawTable } from './table.js';
import { readText } from './text/read-text.js';
import { readWorkbook } from './xlsx/read-workbook.js';

/** Which table is meant, and how it is to be read. */
export interface TableRequest {
  fileId?: string | undefined;
  text?: string | undefined;
  sheet?: string | null | undefined;
  delimiter?: Delimiter | null | undefined;
  decimal?: DecimalSign | null | undefined;
}

export interface Following {
  onRows?: (rows: number) => void;
  signal?: AbortSignal;
}

const KEPT_FOR_MS = 10 * 60 * 1000;
/** Readings at a time: each holds a table in memory, and a workbook also a process. */
const AT_A_TIME = 2;
const WAITING = 20;

/** Reads the tables that people bring; a file that was read stays at hand while its mapping is worked on. */
@Injectable()
export class TablesService {
  /** Files never change, so what was read of one stays true; size counts rows. */
  private readonly tables = new LRUCache<string, RawTable>({
    maxSize: 3 * MAX_ROWS,
    sizeCalculation: ({ rows }) => rows.length + 1,
    ttl: KEPT_FOR_MS,
  });
  private readonly limit = new ConcurrencyLimit(
    AT_A_TIME,
    WAITING,
    () => new ApiError('RATE_LIMITED', 'Too many tables are being read at the moment. Try again in a minute.'),
  );

  constructor(private readonly files: FilesService) {}

  /** @throws {UnreadableTable} when it is no table */
  async read(request: TableRequest, viewer: Viewer, following: Following = {}): Promise<RawTable> {
    const { text } = request;
    if (text !== undefined)
      return this.limit.run(() => readText(bytesOf(text), { ...textOptions(request), ...following }));
    const file = await this.files.find(request.fileId ?? '', viewer);
    const key = JSON.stringify([file.id, request.sheet, request.delimiter, request.decimal]);
    const known = this.tables.get(key);
    if (known) return known;
    const table = await this.limit.run(() => this.readFile(file, request, following));
    this.tables.set(key, table);
    return table;
  }

  private async readFile(file: StoredUpload, request: TableRequest, following: Following): Promise<RawTable> {
    if (file.mediaType === MEDIA_TYPE_OF_WORKBOOK) {
      return readWorkbook(await this.files.read(file), { sheet: request.sheet, ...following });
    }
    return readText(this.bytesIn(file), { ...textOptions(request), ...following });
  }

  private bytesIn(file: StoredUpload): ByteSource {
    const files = this.files;
    return async function* () {
      yield* (await files.open(file)) as AsyncIterable<Uint8Array>;
    };
  }
}

const textOptions = ({ delimiter, decimal }: TableRequest) => ({
  delimiter: delimiter ?? undefined,
  decimal: decimal ?? undefined,
});

const bytesOf = (text: string): ByteSource =>
  async function* () {
    yield await Promise.resolve(Buffer.from(text));
  };
