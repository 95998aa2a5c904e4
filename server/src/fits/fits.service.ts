import { Injectable } from '@nestjs/common';
import { DataSource, EntityManager, In } from 'typeorm';
import { ApiError } from '../common/api-error.js';
import { cachedBatch } from '../common/cached-batch.js';
import { isId } from '../common/graphql/node.js';
import { accepted, type Outcome, refused } from '../common/problem.js';
import { isOfTheGroup, type Viewer } from '../common/viewer.js';
import { fitCorrelation } from '../numerics/fitting/fit-correlation.js';
import { ENGINE_VERSION } from '../numerics/fitting/engine-version.js';
import { type FitRecipe, type FitSeries, type FittedCorrelation } from '../numerics/fitting/fit.types.js';
import { GasPair } from '../pairs/gas-pair.entity.js';
import { Series, type SeriesPoint } from '../series/series.entity.js';
import { SeriesPointsStore } from '../series/series-points.store.js';
import { analyse } from './fit-analysis.js';
import { chooseForFit, type FitChoice, recipeOf, skippedIn, toFitSeries } from './fit-choice.js';
import { Fit } from './fit.entity.js';
import { type FitCorrelationInput } from './fit.input.js';
import { type FitAnalysis } from './fit.types.js';

/** From this many series on, τ is estimated and tells something about the group. */
const SERIES_THAT_SHOW_SCATTER = 3;

const FITS_REMEMBERED = 500;

interface Computation {
  pair: GasPair;
  choice: FitChoice;
  recipe: FitRecipe;
  result: FittedCorrelation;
  points: Map<string, SeriesPoint[]>;
  all: Series[];
}

/** A kept fit with the rows it was computed from. */
export interface FitWithPoints {
  fit: Fit;
  used: Series[];
  leftOut: Series[];
  points: Map<string, SeriesPoint[]>;
}

@Injectable()
export class FitsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly pointsStore: SeriesPointsStore,
  ) {}

  /** Batch function for `loaderFor`: one entry per id, in the order asked. A fit never changes, so it is remembered. */
  readonly byIds = cachedBatch<Fit>({ max: FITS_REMEMBERED }, async (ids) => {
    const found = await this.dataSource.getRepository(Fit).findBy({ id: In([...ids]) });
    const byId = new Map(found.map((fit) => [fit.id, fit]));
    return ids.map((id) => byId.get(id) ?? new Error(`no fit ${id}`));
  });

  /** Batch function for `loaderFor`: ids of the series each fit used. */
  readonly seriesIdsByFit = async (fitIds: readonly string[]): Promise<string[][]> => {
    const rows: { fit_id: string; series_id: string }[] = await this.dataSource.query(
      `SELECT f.fit_id, f.series_id FROM fit_series f JOIN series s ON s.id = f.series_id
        WHERE f.fit_id = ANY ($1) ORDER BY s.created_at, s.id`,
      [fitIds],
    );
    return fitIds.map((id) => rows.filter((row) => row.fit_id === id).map((row) => row.series_id));
  };

  /** One fit, or null. Visitors see those that a released version recommends. */
  async find(id: string, viewer: Viewer | null): Promise<Fit | null> {
    if (!isId(id)) return null;
    const query = this.dataSource.getRepository(Fit).createQueryBuilder('f').where('f.id = :id', { id });
    if (!isOfTheGroup(viewer)) {
      query.andWhere(
        `EXISTS (SELECT FROM data_sheet_versions v WHERE v.fit_id = f.id AND v.status IN ('RELEASED', 'SUPERSEDED', 'WITHDRAWN'))`,
      );
    }
    return query.getOne();
  }

  /** The fits of a pair, newest first; for members of the group. */
  listOfPair(pairId: string): Promise<Fit[]> {
    return this.dataSource.getRepository(Fit).find({ where: { pairId }, order: { number: 'DESC' } });
  }

  /** Computes without keeping. */
  async preview(input: FitCorrelationInput): Promise<Outcome<FitAnalysis>> {
    const outcome = await this.compute(this.dataSource.manager, input);
    if (!outcome.ok) return outcome;
    const { result, choice, points, all } = outcome.value;
    const leftOut = all.filter((series) => choice.leftOut.some((record) => record.seriesId === series.id));
    return accepted(analyse(result, choice.used, leftOut, choice.excluded, points));
  }

  /** Computes and keeps. */
  keep(input: FitCorrelationInput, viewer: Viewer): Promise<Outcome<Fit>> {
    return this.dataSource.transaction(async (tx) => {
      // The pair's row serialises its fits, so that their numbers stay consecutive.
      if (isId(input.pairId)) await tx.query('SELECT FROM gas_pairs WHERE id = $1 FOR UPDATE', [input.pairId]);
      const outcome = await this.compute(tx, input);
      if (!outcome.ok) return outcome;
      const { pair, choice, recipe, result } = outcome.value;
      const number = 1 + (await tx.countBy(Fit, { pairId: pair.id }));
      const fit = await tx.save(
        tx.create(Fit, {
          pairId: pair.id,
          number,
          recipe,
          excluded: choice.excluded,
          leftOut: choice.leftOut,
          result,
          engineVersion: ENGINE_VERSION,
          createdById: viewer.id,
        }),
      );
      await tx.query('INSERT INTO fit_series (fit_id, series_id) SELECT $1, unnest($2::uuid[])', [
        fit.id,
        choice.used.map((series) => series.id),
      ]);
      return accepted(fit);
    });
  }

  async analysisOf(fit: Fit): Promise<FitAnalysis> {
    const { used, leftOut, points } = await this.withPoints(fit);
    return analyse(fit.result, used, leftOut, fit.excluded, points);
  }

  /** The stored rows a fit was made from; accepted series never change, so these are the same for ever. */
  async withPoints(fit: Fit, manager: EntityManager = this.dataSource.manager): Promise<FitWithPoints> {
    const usedIds: { series_id: string }[] = await manager.query('SELECT series_id FROM fit_series WHERE fit_id = $1', [
      fit.id,
    ]);
    const leftOutIds = fit.leftOut.map((record) => record.seriesId);
    const all = await this.seriesInOrder(manager, { id: In([...usedIds.map((row) => row.series_id), ...leftOutIds]) });
    const points = await this.pointsStore.load(
      manager,
      all.map((series) => series.id),
    );
    return {
      fit,
      used: all.filter((series) => !leftOutIds.includes(series.id)),
      leftOut: all.filter((series) => leftOutIds.includes(series.id)),
      points,
    };
  }

  /** Fits again from the stored rows, with the stored choices. */
  async recompute(fit: Fit): Promise<FittedCorrelation | null> {
    const { used, points } = await this.withPoints(fit);
    const outcome = fitCorrelation(toEngineSeries(used, points, fit.excluded), fit.recipe);
    return outcome.ok ? outcome.fit : null;
  }

  private seriesInOrder(manager: EntityManager, where: object): Promise<Series[]> {
    return manager.getRepository(Series).find({ where, order: { createdAt: 'ASC', id: 'ASC' } });
  }

  private async compute(manager: EntityManager, input: FitCorrelationInput): Promise<Outcome<Computation>> {
    const pair = isId(input.pairId) ? await manager.findOneBy(GasPair, { id: input.pairId }) : null;
    if (!pair) throw new ApiError('NOT_FOUND', 'There is no such gas pair.');
    const all = await this.seriesInOrder(manager, { pairId: pair.id });
    const points = await this.pointsStore.load(
      manager,
      all.map((series) => series.id),
    );
    const { choice, problems } = chooseForFit(input, all, points);
    if (problems.length > 0) return refused(...problems);
    const recipe = await this.completeRecipe(manager, recipeOf(input), choice);
    const outcome = fitCorrelation(toEngineSeries(choice.used, points, choice.excluded), recipe);
    if (!outcome.ok) return refused(...outcome.problems);
    return accepted({ pair, choice, recipe, result: outcome.fit, points, all });
  }

  /** With one or two series the scatter between series cannot be estimated: the group's own is assigned. */
  private async completeRecipe(manager: EntityManager, recipe: FitRecipe, choice: FitChoice): Promise<FitRecipe> {
    if (recipe.betweenSeriesDeviation !== null || choice.used.length >= SERIES_THAT_SHOW_SCATTER) return recipe;
    return { ...recipe, betweenSeriesDeviation: await this.groupDeviation(manager) };
  }

  /** Root mean square of τ over the newest fit of each pair that estimated it; null where none did. */
  private async groupDeviation(manager: EntityManager): Promise<number | null> {
    const [row]: { deviation: number | null }[] = await manager.query(`
      SELECT sqrt(avg(tau * tau)) AS deviation FROM (
        SELECT DISTINCT ON (pair_id) (result -> 'statistics' ->> 'betweenSeriesDeviation')::double precision AS tau
        FROM fits
        WHERE result -> 'statistics' ->> 'betweenSeriesOrigin' = 'STATED'
          AND (result -> 'statistics' ->> 'seriesCount')::int >= ${SERIES_THAT_SHOW_SCATTER}
        ORDER BY pair_id, number DESC
      ) newest`);
    return row?.deviation ? row.deviation : null;
  }
}

function toEngineSeries(
  used: readonly Series[],
  points: ReadonlyMap<string, readonly SeriesPoint[]>,
  excluded: Fit['excluded'],
): FitSeries[] {
  return used.map((series) => toFitSeries(series, points.get(series.id) ?? [], skippedIn(excluded, series.id)));
}
