import { Injectable } from '@nestjs/common';
import { LRUCache } from 'lru-cache';
import { DataSource } from 'typeorm';
import { ApiError } from '../common/api-error.js';
import type { Viewer } from '../common/viewer.js';
import { DataSheetsService } from '../data-sheets/data-sheets.service.js';
import { DataSheetVersion } from '../data-sheets/data-sheet-version.entity.js';
import { formatNumber } from '../data-sheets/version-rules.js';
import { Release } from '../releases/release.entity.js';
import { ReleasesService } from '../releases/releases.service.js';
import { SheetFactsService } from '../releases/sheet-facts.service.js';
import { buildSheetContent } from '../sheet-documents/sheet-content.js';
import { withStanding } from '../sheet-documents/sheet-provenance.js';
import type { Snapshot } from '../sheet-documents/snapshot.schema.js';
import { readSnapshot } from '../sheet-documents/snapshot.js';
import type { ReadableVersion } from './readable-version.js';

const SNAPSHOTS_REMEMBERED = 200;
const VERSIONS_REMEMBERED = 2_000;
/** How long a change of standing by another process may go unseen, ms. */
const TRUSTED_MS = 1_000;

/** Versions of data sheets as programs read them. What a viewer may not see is not there. */
@Injectable()
export class ReadableVersionsService {
  /** Snapshots by hash; they never change. */
  private readonly snapshots = new LRUCache<string, Snapshot>({ max: SNAPSHOTS_REMEMBERED });
  /** Released versions by `CODE/number`, as they stand now. */
  private readonly released = new LRUCache<string, ReadableVersion>({ max: VERSIONS_REMEMBERED, ttl: TRUSTED_MS });

  constructor(
    private readonly dataSource: DataSource,
    private readonly sheets: DataSheetsService,
    private readonly releases: ReleasesService,
    private readonly facts: SheetFactsService,
  ) {}

  /** A released version when it was read within the last second; asks nothing of the database. */
  remembered(code: string, number: string): ReadableVersion | undefined {
    return this.released.get(keyOf(code, number));
  }

  /** @throws {ApiError} NOT_FOUND where there is none that the viewer may see */
  async read(code: string, number: string, viewer: Viewer | null): Promise<ReadableVersion> {
    const version = await this.find(code, number, viewer);
    if (version === null) throw new ApiError('NOT_FOUND', `There is no version ${number} of a data sheet ${code}.`);
    const known = this.remembered(code, number);
    // A change of standing in this process is seen at once: it counts the version's changes up.
    if (known?.versionId === version.id && known.changes === version.lockVersion) return known;
    const release = await this.releases.findByVersion(version.id);
    if (release === null) return this.open(code, version);
    const readable = await this.readRelease(version, release);
    this.released.set(keyOf(code, number), readable);
    return readable;
  }

  /** @throws {ApiError} NOT_FOUND where no version of the sheet is current */
  async currentNumber(code: string): Promise<string> {
    const sheet = await this.sheets.findByCode(code, null);
    const [versions] = sheet === null ? [] : await this.sheets.versionsBySheet([sheet.id]);
    const current = Array.isArray(versions) ? versions.find(({ status }) => status === 'RELEASED') : undefined;
    if (current === undefined) throw new ApiError('NOT_FOUND', `Data sheet ${code} has no current version.`);
    return formatNumber(current);
  }

  private async find(code: string, number: string, viewer: Viewer | null): Promise<DataSheetVersion | null> {
    const sheet = await this.sheets.findByCode(code, viewer);
    if (sheet === null) return null;
    const [versions] = await this.sheets.versionsBySheet([sheet.id]);
    return Array.isArray(versions) ? this.sheets.pickVersion(versions, number, viewer) : null;
  }

  private async readRelease(version: DataSheetVersion, release: Release): Promise<ReadableVersion> {
    const { content, correlation } = this.snapshotOf(release);
    const standing = await this.facts.standingOf(version, release);
    const versions = await this.facts.versionsOf(this.dataSource.manager, version);
    return {
      code: content.code,
      number: content.number,
      content: withStanding(content, standing, versions),
      correlation,
      standing,
      versions,
      isReleased: true,
      versionId: version.id,
      changes: version.lockVersion,
    };
  }

  private snapshotOf(release: Release): Snapshot {
    const known = this.snapshots.get(release.contentHash);
    if (known !== undefined) return known;
    const snapshot = readSnapshot(release.snapshot);
    this.snapshots.set(release.contentHash, snapshot);
    return snapshot;
  }

  /** What an unreleased version would say today. */
  private async open(code: string, version: DataSheetVersion): Promise<ReadableVersion> {
    const facts = await this.facts.factsOf(version);
    const { correlation, standing, versions, number } = facts;
    const content = buildSheetContent(facts);
    const named = { code, number, versionId: version.id, changes: version.lockVersion, isReleased: false };
    return { ...named, content, correlation, standing, versions };
  }
}

const keyOf = (code: string, number: string): string => `${code.toUpperCase()}/${number}`;
