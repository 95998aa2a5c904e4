import { Injectable } from '@nestjs/common';
import { DataSource, EntityManager, In } from 'typeorm';
import { ApiError } from '../common/api-error.js';
import { isId } from '../common/graphql/node.js';
import { accepted, type Outcome, problem, type Problem, refused } from '../common/problem.js';
import { type Viewer } from '../common/viewer.js';
import { Fit } from '../fits/fit.entity.js';
import { type StatedPressureRangeInput, type DraftDataSheetInput, type UpdateDraftInput } from './data-sheet.input.js';
import { DataSheet } from './data-sheet.entity.js';
import { DataSheetsService } from './data-sheets.service.js';
import { DataSheetVersion, type StatedPressureRange } from './data-sheet-version.entity.js';
import { correlationOfVersion } from './version-correlation.js';
import {
  nextNumber,
  recommendsTheSame,
  SECTIONS,
  STATES_OF_RELEASED,
  statusAfter,
  transitionProblems,
  type VersionAction,
  type VersionNumber,
  wordProblems,
} from './version-rules.js';

const LOCK = { mode: 'pessimistic_write' } as const;

function pressureRangeProblems(range: StatedPressureRangeInput | null | undefined): Problem[] {
  if (!range) return [];
  const problems: Problem[] = [];
  if (!(range.minimum > 0 && range.maximum > range.minimum)) {
    problems.push(
      problem('BAD_INPUT', 'The range in P begins above zero and ends above its beginning.', 'pressureRange.maximum'),
    );
  }
  if (range.reason.trim() === '')
    problems.push(problem('BAD_INPUT', 'Say why this range holds.', 'pressureRange.reason'));
  return problems;
}

function remarkProblems(input: UpdateDraftInput): Problem[] {
  return (input.remarks ?? []).flatMap(({ section }, i) =>
    (SECTIONS as readonly string[]).includes(section)
      ? []
      : [problem('BAD_INPUT', `A sheet has no section “${section}”.`, `remarks.${i}.section`)],
  );
}

/** Preparing versions: drafting from a fit, editing words, handing in for review. */
@Injectable()
export class DraftingService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly sheets: DataSheetsService,
  ) {}

  /** @throws {ApiError} NOT_FOUND for a fit that is not there */
  draft(input: DraftDataSheetInput, viewer: Viewer): Promise<Outcome<DataSheetVersion>> {
    return this.write(async (tx) => {
      const fit = isId(input.fitId) ? await tx.findOneBy(Fit, { id: input.fitId }) : null;
      if (!fit) throw new ApiError('NOT_FOUND', 'There is no such fit.');
      const sheet = await this.sheetOf(tx, fit.pairId);
      const last = await this.lastReleased(tx, sheet.id);
      const words = { summary: input.summary, changeNote: input.changeNote ?? null };
      const problems = wordProblems(words, last === null);
      if (problems.length > 0) return refused(...problems);
      const version = await tx.save(
        tx.create(DataSheetVersion, {
          dataSheetId: sheet.id,
          ...(await this.numberAfter(tx, last, fit, null)),
          status: 'DRAFT',
          fitId: fit.id,
          summary: words.summary.trim(),
          changeNote: words.changeNote?.trim() || null,
          remarks: {},
          validity: null,
          preparedById: viewer.id,
        }),
      );
      await this.record(tx, version, 'draft', null, viewer);
      return accepted(version);
    });
  }

  /** @throws {ApiError} NOT_FOUND, or CONFLICT when somebody changed the draft meanwhile */
  update(input: UpdateDraftInput, viewer: Viewer): Promise<Outcome<DataSheetVersion>> {
    return this.write(async (tx) => {
      const version = await this.lock(tx, input.versionId, input.lockVersion);
      const last = await this.lastReleased(tx, version.dataSheetId);
      const words = { summary: input.summary, changeNote: input.changeNote ?? null };
      const problems = [
        ...transitionProblems('change', { ...version, seriesOwnerIds: [] }, viewer.id),
        ...wordProblems(words, last === null),
        ...remarkProblems(input),
        ...pressureRangeProblems(input.pressureRange),
      ];
      if (problems.length > 0) return refused(...problems);
      const validity: StatedPressureRange | null = input.pressureRange ? { ...input.pressureRange } : null;
      const fit = await tx.findOneByOrFail(Fit, { id: version.fitId });
      Object.assign(version, await this.numberAfter(tx, last, fit, validity), {
        status: statusAfter('change'),
        summary: words.summary.trim(),
        changeNote: words.changeNote?.trim() || null,
        remarks: Object.fromEntries(
          (input.remarks ?? []).map(({ section, text }) => [section, text.trim()] as const).filter(([, text]) => text),
        ),
        validity,
      });
      const saved = await tx.save(version);
      await this.record(tx, saved, 'change', null, viewer);
      return accepted(saved);
    });
  }

  /** @throws {ApiError} NOT_FOUND, or CONFLICT when somebody acted on the version meanwhile */
  async submit(versionId: string, viewer: Viewer): Promise<Outcome<DataSheetVersion>> {
    const seen = await this.read(versionId);
    const problems = transitionProblems('submit', { ...seen, seriesOwnerIds: [] }, viewer.id);
    if (problems.length > 0) return refused(...problems);
    return this.write(async (tx) => {
      const version = await this.lock(tx, versionId, seen.lockVersion);
      version.status = statusAfter('submit');
      const saved = await tx.save(version);
      await this.record(tx, saved, 'submit', null, viewer);
      return accepted(saved);
    });
  }

  /** One transaction; what readers are remembered to see of the sheet is dropped once it has committed. */
  private async write(
    work: (tx: EntityManager) => Promise<Outcome<DataSheetVersion>>,
  ): Promise<Outcome<DataSheetVersion>> {
    const outcome = await this.dataSource.transaction(work);
    if (outcome.ok) this.sheets.forget(outcome.value.dataSheetId);
    return outcome;
  }

  /**
   * The version, locked for a change.
   *
   * @param seen the count of changes the caller looked at
   * @throws {ApiError} NOT_FOUND, or CONFLICT when it has grown since
   */
  async lock(tx: EntityManager, versionId: string, seen: number): Promise<DataSheetVersion> {
    const version = isId(versionId)
      ? await tx.findOne(DataSheetVersion, { where: { id: versionId }, lock: LOCK })
      : null;
    if (!version) throw new ApiError('NOT_FOUND', 'There is no such version.');
    if (version.lockVersion !== seen) {
      throw new ApiError(
        'CONFLICT',
        'Somebody else changed this version meanwhile. Load it again and repeat what you did.',
      );
    }
    return version;
  }

  /** The version as it stands now, without a lock. @throws {ApiError} NOT_FOUND */
  async read(versionId: string): Promise<DataSheetVersion> {
    const version = isId(versionId)
      ? await this.dataSource.manager.findOneBy(DataSheetVersion, { id: versionId })
      : null;
    if (!version) throw new ApiError('NOT_FOUND', 'There is no such version.');
    return version;
  }

  /** People who brought in or submitted a series that the version's fit used. */
  async seriesOwners(manager: EntityManager, version: DataSheetVersion): Promise<string[]> {
    const rows: { id: string }[] = await manager.query(
      `SELECT DISTINCT unnest(ARRAY[s.created_by_id, s.submitted_by_id]) AS id
         FROM fit_series f JOIN series s ON s.id = f.series_id WHERE f.fit_id = $1`,
      [version.fitId],
    );
    return rows.map((row) => row.id);
  }

  async record(
    tx: EntityManager,
    version: DataSheetVersion,
    action: VersionAction | 'draft' | 'supersede',
    remark: string | null,
    viewer: Viewer,
  ) {
    await tx.query(
      'INSERT INTO version_events (version_id, action, status, remark, person_id) VALUES ($1, $2, $3, $4, $5)',
      [version.id, action, version.status, remark, viewer.id],
    );
  }

  /** The newest version of a sheet that was ever released, or null. */
  lastReleased(tx: EntityManager, sheetId: string): Promise<DataSheetVersion | null> {
    return tx.findOne(DataSheetVersion, {
      where: { dataSheetId: sheetId, status: In([...STATES_OF_RELEASED]) },
      order: { edition: 'DESC', revision: 'DESC' },
    });
  }

  /** The number a version of this fit and range takes after `last`. */
  async numberAfter(
    tx: EntityManager,
    last: DataSheetVersion | null,
    fit: Fit,
    validity: StatedPressureRange | null,
  ): Promise<VersionNumber> {
    if (!last) return nextNumber(null, false);
    const lastFit = await tx.findOneByOrFail(Fit, { id: last.fitId });
    const isSame = recommendsTheSame(
      correlationOfVersion(lastFit.result, last.validity),
      correlationOfVersion(fit.result, validity),
    );
    return nextNumber(last, isSame);
  }

  private async sheetOf(tx: EntityManager, pairId: string): Promise<DataSheet> {
    // Looked up first: an insert that finds the sheet there would use up a number all the same.
    if (!(await tx.existsBy(DataSheet, { pairId }))) {
      await tx.query('INSERT INTO data_sheets (pair_id) VALUES ($1) ON CONFLICT DO NOTHING', [pairId]);
    }
    // The sheet's row serialises its drafts, so that their numbers follow one another.
    return tx.findOneOrFail(DataSheet, { where: { pairId }, lock: LOCK });
  }
}
