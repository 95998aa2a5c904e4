import { Inject, Injectable } from '@nestjs/common';
import { DataSource, EntityManager, In, Not } from 'typeorm';
import { ApiError } from '../common/api-error.js';
import { cachedBatch } from '../common/cached-batch.js';
import { accepted, type Outcome, problem, refused } from '../common/problem.js';
import { type Viewer } from '../common/viewer.js';
import { ENV } from '../config/config.module.js';
import { type Env } from '../config/env.js';
import { PasswordsService } from '../auth/passwords.service.js';
import { DataSheet } from '../data-sheets/data-sheet.entity.js';
import { DataSheetVersion } from '../data-sheets/data-sheet-version.entity.js';
import { DataSheetsService } from '../data-sheets/data-sheets.service.js';
import { DraftingService } from '../data-sheets/drafting.service.js';
import { formatNumber, statusAfter, transitionProblems } from '../data-sheets/version-rules.js';
import { Fit } from '../fits/fit.entity.js';
import { Person } from '../people/person.entity.js';
import { snapshotOf } from '../sheet-documents/snapshot.js';
import { ReleaseNoticesService } from './release-notices.service.js';
import { Release } from './release.entity.js';
import { SheetFactsService } from './sheet-facts.service.js';

/** Any number; whoever holds the lock writes the next link of the chain. */
const CHAIN_LOCK = 428_001;

const RELEASES_REMEMBERED = 500;

/** Why other open versions of a sheet go back when one is released. */
const OVERTAKEN = 'Another version was released meanwhile; check this one against it.';

@Injectable()
export class ReleasesService {
  constructor(
    @Inject(ENV) private readonly env: Env,
    private readonly dataSource: DataSource,
    private readonly sheets: DataSheetsService,
    private readonly drafting: DraftingService,
    private readonly passwords: PasswordsService,
    private readonly facts: SheetFactsService,
    private readonly notices: ReleaseNoticesService,
  ) {}

  /** Batch function for `loaderFor`: the release of each version, or null. */
  readonly byVersions = async (versionIds: readonly string[]): Promise<(Release | null | Error)[]> =>
    (await this.remembered(versionIds)).map((row) => (row instanceof Error ? row : row.release));

  /** A release never changes; that there is none yet may. */
  private readonly remembered = cachedBatch<{ release: Release | null }>(
    { max: RELEASES_REMEMBERED, keep: ({ release }) => release !== null },
    async (versionIds) => {
      const found = await this.dataSource.getRepository(Release).findBy({ versionId: In([...versionIds]) });
      const byVersion = new Map(found.map((release) => [release.versionId, release]));
      return versionIds.map((id) => ({ release: byVersion.get(id) ?? null }));
    },
  );

  /**
   * Freezes an approved version as the sheet's next, or says why it may not be.
   *
   * One transaction: snapshot, hash and link of the chain; the version before becomes superseded; mail, DOI and the archived
   * PDF are jobs of the same transaction.
   *
   * @throws {ApiError} NOT_FOUND, or CONFLICT when somebody acted on the version meanwhile
   */
  async release(versionId: string, password: string, viewer: Viewer): Promise<Outcome<DataSheetVersion>> {
    const seen = await this.drafting.read(versionId);
    const problems = transitionProblems('release', { ...seen, seriesOwnerIds: [] }, viewer.id);
    if (problems.length > 0) return refused(...problems);
    if (!(await this.passwords.verifyPassword(viewer.id, password))) {
      return refused(problem('WRONG_PASSWORD', 'This is not your password.', 'password'));
    }
    const outcome = await this.dataSource.transaction(async (tx) => {
      await tx.query('SELECT pg_advisory_xact_lock($1)', [CHAIN_LOCK]);
      const sheet = await tx.findOneOrFail(DataSheet, {
        where: { id: seen.dataSheetId },
        lock: { mode: 'pessimistic_write' },
      });
      const version = await this.drafting.lock(tx, versionId, seen.lockVersion);
      const earlier = await tx.findOneBy(DataSheetVersion, { dataSheetId: sheet.id, status: 'RELEASED' });

      const release = await this.freeze(tx, sheet, version, viewer);
      if (earlier) {
        Object.assign(earlier, { status: 'SUPERSEDED', supersededById: version.id });
        await tx.save(earlier);
        await this.drafting.record(tx, earlier, 'supersede', `by version ${formatNumber(version)}`, viewer);
      }
      version.status = statusAfter('release');
      const saved = await tx.save(version);
      await this.drafting.record(tx, saved, 'release', null, viewer);
      await this.sendBackOvertaken(tx, saved, viewer);
      await this.notices.released(tx, { sheet, version: saved, release, earlier });
      return accepted(saved);
    });
    this.sheets.forget(seen.dataSheetId);
    return outcome;
  }

  /** @throws {ApiError} NOT_FOUND, or CONFLICT when somebody acted on the version meanwhile */
  async withdraw(
    versionId: string,
    reason: string,
    password: string,
    viewer: Viewer,
  ): Promise<Outcome<DataSheetVersion>> {
    const seen = await this.drafting.read(versionId);
    const problems = transitionProblems('withdraw', { ...seen, seriesOwnerIds: [] }, viewer.id, reason);
    if (problems.length > 0) return refused(...problems);
    if (!(await this.passwords.verifyPassword(viewer.id, password))) {
      return refused(problem('WRONG_PASSWORD', 'This is not your password.', 'password'));
    }
    const outcome = await this.dataSource.transaction(async (tx) => {
      const sheet = await tx.findOneOrFail(DataSheet, {
        where: { id: seen.dataSheetId },
        lock: { mode: 'pessimistic_write' },
      });
      const version = await this.drafting.lock(tx, versionId, seen.lockVersion);
      Object.assign(version, {
        status: statusAfter('withdraw'),
        withdrawnAt: new Date(),
        withdrawnById: viewer.id,
        withdrawalReason: reason.trim(),
      });
      const saved = await tx.save(version);
      await this.drafting.record(tx, saved, 'withdraw', reason.trim(), viewer);
      await this.notices.withdrawn(tx, { sheet, version: saved });
      return accepted(saved);
    });
    this.sheets.forget(seen.dataSheetId);
    return outcome;
  }

  async findByHash(contentHash: string): Promise<Release | null> {
    return this.dataSource.getRepository(Release).findOneBy({ contentHash });
  }

  async findByVersion(versionId: string): Promise<Release | null> {
    return this.dataSource.getRepository(Release).findOneBy({ versionId });
  }

  private async freeze(
    tx: EntityManager,
    sheet: DataSheet,
    version: DataSheetVersion,
    viewer: Viewer,
  ): Promise<Release> {
    const last = await tx.findOne(Release, { where: {}, order: { sequence: 'DESC' } });
    const person = await tx.findOneByOrFail(Person, { id: viewer.id });
    const releasedAt = new Date();
    const doi = `${this.env.DOI_PREFIX}/diffolio.${sheet.code.toLowerCase()}.v${formatNumber(version)}`;
    const { text, contentHash } = snapshotOf(await this.facts.factsOf(version, tx), {
      releasedAt: releasedAt.toISOString(),
      releasedBy: person.name,
      doi,
      previousHash: last?.contentHash ?? null,
    });
    const release = tx.create(Release, {
      sequence: String(BigInt(last?.sequence ?? 0) + 1n),
      versionId: version.id,
      contentHash,
      previousHash: last?.contentHash ?? null,
      snapshot: text,
      doi,
      releasedById: viewer.id,
      releasedAt,
    });
    await tx.insert(Release, release);
    return release;
  }

  /** Open versions of the sheet were written, and perhaps approved, against the one just superseded. */
  private async sendBackOvertaken(tx: EntityManager, released: DataSheetVersion, viewer: Viewer): Promise<void> {
    const open = await tx.find(DataSheetVersion, {
      where: {
        dataSheetId: released.dataSheetId,
        id: Not(released.id),
        status: In(['DRAFT', 'IN_REVIEW', 'RETURNED', 'APPROVED']),
      },
      lock: { mode: 'pessimistic_write' },
    });
    for (const version of open) {
      const fit = await tx.findOneByOrFail(Fit, { id: version.fitId });
      Object.assign(version, await this.drafting.numberAfter(tx, released, fit, version.validity));
      if (version.status !== 'DRAFT') version.status = 'RETURNED';
      const saved = await tx.save(version);
      await this.drafting.record(tx, saved, 'return', OVERTAKEN, viewer);
    }
  }
}

/** Thrown where a release that must be there is not. */
export function noSuchRelease(): ApiError {
  return new ApiError('NOT_FOUND', 'There is no such release.');
}
