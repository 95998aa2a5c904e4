import { Injectable } from '@nestjs/common';
import { DataSource, In } from 'typeorm';
import { accepted, type Outcome, refused } from '../common/problem.js';
import { type Viewer } from '../common/viewer.js';
import { DataSheetVersion } from '../data-sheets/data-sheet-version.entity.js';
import { DataSheetsService } from '../data-sheets/data-sheets.service.js';
import { DraftingService } from '../data-sheets/drafting.service.js';
import { statusAfter, transitionProblems } from '../data-sheets/version-rules.js';
import { Fit } from '../fits/fit.entity.js';
import { FitsService } from '../fits/fits.service.js';
import { compareToStored, type ReproducedNumber } from './reproduction-rules.js';
import { REVIEW_ANSWERS, REVIEW_QUESTIONS } from './review-checklist.js';
import { type ChecklistAnswer, Review, type ReviewVerdict } from './review.entity.js';

export interface ReviewRequest {
  versionId: string;
  verdict: `${ReviewVerdict}`;
  remark: string;
  checklist?: readonly ChecklistAnswer[] | null;
}

/** The whole checklist, with the answers given and null for those that are not. */
function completeChecklist(given: readonly ChecklistAnswer[] | null | undefined): ChecklistAnswer[] {
  const answers = new Map((given ?? []).map(({ question, answer }) => [question, answer]));
  return REVIEW_QUESTIONS.map((question) => {
    const answer = answers.get(question) ?? null;
    return { question, answer: (REVIEW_ANSWERS as readonly (string | null)[]).includes(answer) ? answer : null };
  });
}

@Injectable()
export class ReviewsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly sheets: DataSheetsService,
    private readonly drafting: DraftingService,
    private readonly fits: FitsService,
  ) {}

  /** Batch function for `loaderFor`: the reviews of each version, oldest first. */
  readonly byVersions = async (versionIds: readonly string[]): Promise<Review[][]> => {
    const found = await this.dataSource
      .getRepository(Review)
      .find({ where: { versionId: In([...versionIds]) }, order: { createdAt: 'ASC', id: 'ASC' } });
    return versionIds.map((id) => found.filter((review) => review.versionId === id));
  };

  /** @throws {ApiError} NOT_FOUND, or CONFLICT when somebody acted on the version meanwhile */
  async record(request: ReviewRequest, viewer: Viewer): Promise<Outcome<DataSheetVersion>> {
    const seen = await this.drafting.read(request.versionId);
    const action = request.verdict === 'APPROVE' ? 'approve' : 'return';
    const seriesOwnerIds = await this.drafting.seriesOwners(this.dataSource.manager, seen);
    const problems = transitionProblems(action, { ...seen, seriesOwnerIds }, viewer.id, request.remark);
    if (problems.length > 0) return refused(...problems);
    const outcome = await this.dataSource.transaction(async (tx) => {
      const version = await this.drafting.lock(tx, request.versionId, seen.lockVersion);
      version.status = statusAfter(action);
      const saved = await tx.save(version);
      await tx.save(
        tx.create(Review, {
          versionId: version.id,
          reviewerId: viewer.id,
          verdict: request.verdict,
          remark: request.remark.trim(),
          checklist: completeChecklist(request.checklist),
        }),
      );
      await this.drafting.record(tx, saved, action, request.remark.trim(), viewer);
      return accepted(saved);
    });
    this.sheets.forget(seen.dataSheetId);
    return outcome;
  }

  /** Fits again from the stored points and compares to 12 digits. @throws {ApiError} NOT_FOUND */
  async reproduce(versionId: string): Promise<ReproducedNumber[]> {
    const version = await this.drafting.read(versionId);
    const fit = await this.dataSource.manager.findOneByOrFail(Fit, { id: version.fitId });
    const recomputed = await this.fits.recompute(fit);
    if (!recomputed) throw new Error(`fit ${fit.id} cannot be computed again`);
    return compareToStored(fit.result, recomputed);
  }
}
