import { Injectable } from '@nestjs/common';
import { DataSource, In } from 'typeorm';
import { cachedBatch } from '../common/cached-batch.js';
import { type Page } from '../common/graphql/connection.js';
import { isOfTheGroup, type Viewer } from '../common/viewer.js';
import { DataSheet } from './data-sheet.entity.js';
import { DataSheetVersion, type VersionEvent } from './data-sheet-version.entity.js';
import { isReleased, parseNumber } from './version-rules.js';

const HAS_A_RELEASE = `EXISTS (SELECT FROM data_sheet_versions v
  WHERE v.data_sheet_id = d.id AND v.status IN ('RELEASED', 'SUPERSEDED', 'WITHDRAWN'))`;

/** All that a reader may search a sheet by. */
const SEARCHED_TEXT = `lower(d.code || ' ' || a.name || ' ' || a.formula || ' ' || array_to_string(a.synonyms, ' ') || ' '
  || coalesce(a.cas_number, '') || ' ' || b.name || ' ' || b.formula || ' ' || array_to_string(b.synonyms, ' ') || ' '
  || coalesce(b.cas_number, ''))`;

const SHEETS_REMEMBERED = 2_000;
/** How long another process's change may go unseen, ms. */
const TRUSTED_MS = 1_000;

/** Newest first. */
const BY_NUMBER = { edition: 'DESC', revision: 'DESC', createdAt: 'DESC' } as const;

/** Reading sheets and their versions; what the viewer may not see is not there. */
@Injectable()
export class DataSheetsService {
  constructor(private readonly dataSource: DataSource) {}

  /** Batch function for `loaderFor`: one entry per id, in the order asked. */
  readonly byIds = async (ids: readonly string[]): Promise<(DataSheet | Error)[]> => {
    const found = await this.dataSource.getRepository(DataSheet).findBy({ id: In([...ids]) });
    const byId = new Map(found.map((sheet) => [sheet.id, sheet]));
    return ids.map((id) => byId.get(id) ?? new Error(`no data sheet ${id}`));
  };

  /** Batch function for `loaderFor`: the sheet of each pair, or null. */
  readonly byPairs = async (pairIds: readonly string[]): Promise<(DataSheet | null)[]> => {
    const found = await this.dataSource.getRepository(DataSheet).findBy({ pairId: In([...pairIds]) });
    const byPair = new Map(found.map((sheet) => [sheet.pairId, sheet]));
    return pairIds.map((id) => byPair.get(id) ?? null);
  };

  /** Batch function for `loaderFor`: every version of each sheet, newest first, whoever asks. */
  readonly versionsBySheet = cachedBatch<DataSheetVersion[]>(
    { max: SHEETS_REMEMBERED, ttl: TRUSTED_MS },
    async (sheetIds) => {
      const found = await this.dataSource
        .getRepository(DataSheetVersion)
        .find({ where: { dataSheetId: In([...sheetIds]) }, order: BY_NUMBER });
      return sheetIds.map((id) => found.filter((version) => version.dataSheetId === id));
    },
  );

  /** Sheets by code; a sheet itself never changes, so it is remembered. */
  private readonly byCode = cachedBatch<DataSheet>({ max: SHEETS_REMEMBERED }, async (codes) => {
    const found = await this.dataSource.getRepository(DataSheet).findBy({ code: In([...codes]) });
    return codes.map((code) => found.find((sheet) => sheet.code === code) ?? new Error(`no data sheet ${code}`));
  });

  /** Batch function for `loaderFor`: versions by id, whoever asks. */
  readonly versionsByIds = async (ids: readonly string[]): Promise<(DataSheetVersion | Error)[]> => {
    const found = await this.dataSource.getRepository(DataSheetVersion).findBy({ id: In([...ids]) });
    const byId = new Map(found.map((version) => [version.id, version]));
    return ids.map((id) => byId.get(id) ?? new Error(`no version ${id}`));
  };

  /** Batch function for `loaderFor`: what happened to each version, oldest first. */
  readonly eventsByVersion = async (ids: readonly string[]): Promise<VersionEvent[][]> => {
    const rows: (VersionEvent & { versionId: string })[] = await this.dataSource.query(
      'SELECT version_id AS "versionId", action, status, remark, person_id AS "personId", at FROM version_events WHERE version_id = ANY ($1) ORDER BY id',
      [ids],
    );
    return ids.map((id) => rows.filter((row) => row.versionId === id));
  };

  async list(search: string | null | undefined, page: Page, viewer: Viewer | null): Promise<[DataSheet[], number]> {
    const query = this.dataSource
      .getRepository(DataSheet)
      .createQueryBuilder('d')
      .innerJoin('gas_pairs', 'p', 'p.id = d.pair_id')
      .innerJoin('substances', 'a', 'a.id = p.first_id')
      .innerJoin('substances', 'b', 'b.id = p.second_id')
      .where(isOfTheGroup(viewer) ? 'true' : HAS_A_RELEASE)
      .orderBy('lower(a.name)')
      .addOrderBy('lower(b.name)');
    const words = (search ?? '')
      .toLowerCase()
      .split(/[\s+,]+/)
      .filter(Boolean);
    words.forEach((word, i) => {
      const part = `%${word.replace(/[\\%_]/g, (character) => `\\${character}`)}%`;
      query.andWhere(`${SEARCHED_TEXT} LIKE :part${i}`, { [`part${i}`]: part });
    });
    const count = await query.getCount();
    return [await query.offset(page.offset).limit(page.limit).getMany(), count];
  }

  async findByCode(code: string, viewer: Viewer | null): Promise<DataSheet | null> {
    const [sheet] = await this.byCode([code.trim().toUpperCase()]);
    if (!sheet || sheet instanceof Error) return null;
    return isOfTheGroup(viewer) || (await this.hasRelease(sheet.id)) ? sheet : null;
  }

  /** Drops what is remembered of a sheet's versions, after one has changed. */
  forget(sheetId: string): void {
    this.versionsBySheet.forget(sheetId);
  }

  /** The one of `versions` with this number that the viewer may see; a released one before a draft of the same number. */
  pickVersion(versions: readonly DataSheetVersion[], number: string, viewer: Viewer | null): DataSheetVersion | null {
    const wanted = parseNumber(number);
    const fitting = this.visible(versions, viewer).filter(
      (version) => version.edition === wanted?.edition && version.revision === wanted.revision,
    );
    return fitting.find((version) => isReleased(version.status)) ?? fitting[0] ?? null;
  }

  visible(versions: readonly DataSheetVersion[], viewer: Viewer | null): DataSheetVersion[] {
    return versions.filter((version) => isReleased(version.status) || isOfTheGroup(viewer));
  }

  /** Newest releases or withdrawals over all sheets, for the catalogue's margin. */
  newest(kind: 'released' | 'withdrawn', limit: number): Promise<DataSheetVersion[]> {
    const versions = this.dataSource.getRepository(DataSheetVersion);
    if (kind === 'withdrawn')
      return versions.find({ where: { status: 'WITHDRAWN' }, order: { withdrawnAt: 'DESC' }, take: limit });
    return versions
      .createQueryBuilder('v')
      .innerJoin('releases', 'r', 'r.version_id = v.id')
      .where('v.status = :status', { status: 'RELEASED' })
      .orderBy('r.sequence', 'DESC')
      .limit(limit)
      .getMany();
  }

  private async hasRelease(sheetId: string): Promise<boolean> {
    const [versions] = await this.versionsBySheet([sheetId]);
    return Array.isArray(versions) && versions.some((version) => isReleased(version.status));
  }
}
