import { Injectable } from '@nestjs/common';
import { DataSource, EntityManager, In } from 'typeorm';
import { ApiError } from '../common/api-error.js';
import { type Page } from '../common/graphql/connection.js';
import { isId } from '../common/graphql/node.js';
import { accepted, type Outcome, problem, type Problem, refused, type Warning } from '../common/problem.js';
import { hasRole, isOfTheGroup, type Viewer } from '../common/viewer.js';
import { MailService } from '../mail/mail.service.js';
import { PublicAddressService } from '../mail/public-address.service.js';
import { PairsService } from '../pairs/pairs.service.js';
import { Person } from '../people/person.entity.js';
import { type IncomingPoint, pointProblems, pointWarnings } from './series-point-rules.js';
import { usualRelativeUncertainty } from './measurement-methods.js';
import { type NewSeriesPoint, SeriesPointsStore } from './series-points.store.js';
import { type SeriesAction, type SeriesStatusName, statusAfter, transitionProblems } from './series-rules.js';
import { DataOrigin, PressureOrigin, Series, type SeriesEvent, UncertaintyOrigin } from './series.entity.js';
import { type CreateSeriesInput, type UpdateSeriesInput } from './series.input.js';

/** Most points that one request over the API may carry; larger tables come in as files. */
const MOST_POINTS_OVER_API = 10_000;

/** A series that a released version used is public for ever. */
const USED_BY_A_RELEASE = `EXISTS (SELECT FROM fit_series used JOIN data_sheet_versions v ON v.fit_id = used.fit_id
  WHERE used.series_id = s.id AND v.status IN ('RELEASED', 'SUPERSEDED', 'WITHDRAWN'))`;

interface SeriesHeader {
  title: string;
  source: string;
  method: string;
  commonRelativeUncertainty?: number | null;
}

function headerProblems(header: SeriesHeader): Problem[] {
  const problems: Problem[] = [];
  for (const [field, name] of [
    ['title', 'title'],
    ['source', 'source'],
    ['method', 'method of measurement'],
  ] as const) {
    if (header[field].trim() === '') problems.push(problem('BAD_INPUT', `A series has a ${name}.`, field));
  }
  const common = header.commonRelativeUncertainty;
  if (common !== null && common !== undefined && !(common >= 0 && common < 1)) {
    problems.push(
      problem(
        'BAD_INPUT',
        'The common part is a relative standard uncertainty between 0 and 1.',
        'commonRelativeUncertainty',
      ),
    );
  }
  return problems;
}

/** The points as they are kept: what is not stated is assigned from the method's usual value, and flagged. */
function completePoints(
  points: readonly (IncomingPoint & { pressureOrigin?: PressureOrigin | null })[],
  method: string,
): NewSeriesPoint[] {
  const usual = usualRelativeUncertainty(method).value;
  return points.map((point) => {
    const stated = point.diffusivityUncertainty ?? null;
    return {
      temperature: point.temperature,
      pressure: point.pressure,
      pressureOrigin: point.pressureOrigin ?? PressureOrigin.STATED,
      diffusivity: point.diffusivity,
      diffusivityUncertainty: stated ?? usual * point.diffusivity,
      uncertaintyOrigin: stated === null ? UncertaintyOrigin.ASSIGNED : UncertaintyOrigin.STATED,
      temperatureUncertainty: point.temperatureUncertainty ?? null,
      pressureUncertainty: point.pressureUncertainty ?? null,
      moleFraction: point.moleFraction ?? null,
      replicates: point.replicates ?? null,
    };
  });
}

function warningsOf(points: readonly IncomingPoint[], method: string): Warning[] {
  const warnings = pointWarnings(points);
  const assigned = points.filter((point) => (point.diffusivityUncertainty ?? null) === null).length;
  if (assigned > 0) {
    const usual = usualRelativeUncertainty(method);
    const percent = Number((usual.value * 100).toPrecision(3));
    const message = `u(D) of ${assigned} of ${points.length} points was not stated; ${percent} % of D is assigned, the usual value for this method (${usual.source}).`;
    warnings.push({ code: 'UNCERTAINTY_ASSIGNED', message, path: 'points' });
  }
  return warnings;
}

@Injectable()
export class SeriesService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly pairs: PairsService,
    private readonly points: SeriesPointsStore,
    private readonly mail: MailService,
    private readonly addresses: PublicAddressService,
  ) {}

  /** Batch function for `loaderFor`: one entry per id, in the order asked, whoever asks. */
  readonly byIds = async (ids: readonly string[]): Promise<(Series | Error)[]> => {
    const found = await this.dataSource.getRepository(Series).findBy({ id: In([...ids]) });
    const byId = new Map(found.map((series) => [series.id, series]));
    return ids.map((id) => byId.get(id) ?? new Error(`no series ${id}`));
  };

  /** Batch function for `loaderFor`: place of each series among all of its pair, from 0, in the order they came. */
  readonly ordinals = async (ids: readonly string[]): Promise<(number | Error)[]> => {
    const rows: { id: string; ordinal: number }[] = await this.dataSource.query(
      `SELECT id, ordinal FROM (
         SELECT id, (row_number() OVER (PARTITION BY pair_id ORDER BY created_at, id) - 1)::int AS ordinal FROM series
          WHERE pair_id IN (SELECT pair_id FROM series WHERE id = ANY ($1))
       ) placed WHERE id = ANY ($1)`,
      [ids],
    );
    const byId = new Map(rows.map((row) => [row.id, row.ordinal]));
    return ids.map((id) => byId.get(id) ?? new Error(`no series ${id}`));
  };

  /** Batch function for `loaderFor`: what happened to each series, oldest first. */
  readonly eventsBySeries = async (ids: readonly string[]): Promise<SeriesEvent[][]> => {
    const rows: (SeriesEvent & { seriesId: string })[] = await this.dataSource.query(
      'SELECT series_id AS "seriesId", action, status, remark, person_id AS "personId", at FROM series_events WHERE series_id = ANY ($1) ORDER BY id',
      [ids],
    );
    return ids.map((id) => rows.filter((row) => row.seriesId === id));
  };

  /** One series, or null when there is none that the viewer may see. */
  async find(id: string, viewer: Viewer | null): Promise<Series | null> {
    if (!isId(id)) return null;
    return this.visibleTo(viewer).andWhere('s.id = :id', { id }).getOne();
  }

  /** Series in the order they came, those the viewer may see; of one pair, one person or some states where asked. */
  async list(
    filter: { pairId?: string; createdById?: string; statuses?: readonly SeriesStatusName[] | null },
    page: Page | null,
    viewer: Viewer | null,
  ): Promise<[Series[], number]> {
    const query = this.visibleTo(viewer).orderBy('s.createdAt').addOrderBy('s.id');
    if (filter.pairId) query.andWhere('s.pairId = :pairId', { pairId: filter.pairId });
    if (filter.createdById) query.andWhere('s.createdById = :createdById', { createdById: filter.createdById });
    if (filter.statuses)
      query.andWhere('s.status IN (:...statuses)', { statuses: filter.statuses.length ? filter.statuses : [''] });
    if (page) query.offset(page.offset).limit(page.limit);
    return query.getManyAndCount();
  }

  async createFromApi(input: CreateSeriesInput, viewer: Viewer): Promise<Outcome<Series>> {
    if (input.points.length > MOST_POINTS_OVER_API) {
      return refused(
        problem(
          'BAD_INPUT',
          `At most ${MOST_POINTS_OVER_API} points at once; bring larger tables in as a file.`,
          'points',
        ),
      );
    }
    return this.create(input, viewer, null);
  }

  /** A new draft with its points, whole or not at all. */
  async create(input: CreateSeriesInput, viewer: Viewer, fileId: string | null): Promise<Outcome<Series>> {
    const problems = [...headerProblems(input), ...pointProblems(input.points)];
    if (problems.length > 0) return refused(...problems);
    return this.dataSource.transaction(async (tx) => {
      const pair = await this.pairs.findOrCreate(tx, input.a, input.b);
      if (!pair.ok) return pair;
      const repeated = await this.sameDataProblems(tx, input.sameDataAsId, pair.value.id);
      if (repeated.length > 0) return refused(...repeated);
      const series = await tx.save(
        tx.create(Series, {
          ...headerOf(input),
          pairId: pair.value.id,
          status: 'DRAFT',
          fileId,
          warnings: warningsOf(input.points, input.method),
          createdById: viewer.id,
          submittedById: null,
        }),
      );
      await this.points.insert(tx, series.id, completePoints(input.points, input.method));
      await this.record(tx, series, 'create', null, viewer);
      return accepted(series);
    });
  }

  /** @throws {ApiError} NOT_FOUND, FORBIDDEN for somebody else's series, CONFLICT when it changed meanwhile */
  async update(input: UpdateSeriesInput, viewer: Viewer): Promise<Outcome<Series>> {
    const problems = [...headerProblems(input), ...(input.points ? pointProblems(input.points) : [])];
    if (problems.length > 0) return refused(...problems);
    return this.dataSource.transaction(async (tx) => {
      const series = await this.lockOwn(tx, input.id, viewer, input.lockVersion);
      const refusals = [
        ...transitionProblems('change', series, viewer.id),
        ...(await this.sameDataProblems(tx, input.sameDataAsId, series.pairId, series.id)),
      ];
      if (refusals.length > 0) return refused(...refusals);
      Object.assign(series, headerOf(input), { status: statusAfter('change') });
      if (input.points) {
        series.warnings = warningsOf(input.points, input.method);
        await this.points.replace(tx, series.id, completePoints(input.points, input.method));
      }
      // Counted here, because TypeORM counts no change where only the points differ.
      series.lockVersion += 1;
      const saved = await tx.save(series);
      await this.record(tx, saved, 'change', null, viewer);
      return accepted(saved);
    });
  }

  /** @throws {ApiError} NOT_FOUND, FORBIDDEN for somebody else's series */
  submit(id: string, viewer: Viewer): Promise<Outcome<Series>> {
    return this.change(id, 'submit', null, viewer);
  }

  accept(id: string, viewer: Viewer): Promise<Outcome<Series>> {
    return this.change(id, 'accept', null, viewer);
  }

  giveBack(id: string, remark: string, viewer: Viewer): Promise<Outcome<Series>> {
    return this.change(id, 'return', remark, viewer);
  }

  retire(id: string, remark: string, viewer: Viewer): Promise<Outcome<Series>> {
    return this.change(id, 'retire', remark, viewer);
  }

  /** Judged by what stands before the lock is had: of two who act at once, one wins and the other hears CONFLICT. */
  private async change(
    id: string,
    action: SeriesAction,
    remark: string | null,
    viewer: Viewer,
  ): Promise<Outcome<Series>> {
    const seen = await this.findOwn(this.dataSource.manager, id, viewer);
    const problems = transitionProblems(action, seen, viewer.id, remark);
    if (problems.length > 0) return refused(...problems);
    return this.dataSource.transaction(async (tx) => {
      const series = await this.lockOwn(tx, id, viewer, seen.lockVersion);
      series.status = statusAfter(action);
      if (action === 'submit') series.submittedById = viewer.id;
      const saved = await tx.save(series);
      await this.record(tx, saved, action, remark, viewer);
      if (action === 'return') await this.tellOwner(tx, saved, remark ?? '', viewer);
      return accepted(saved);
    });
  }

  private async tellOwner(tx: EntityManager, series: Series, remark: string, viewer: Viewer): Promise<void> {
    const owner = await tx.findOneByOrFail(Person, { id: series.createdById });
    const editor = await tx.findOneByOrFail(Person, { id: viewer.id });
    await this.mail.enqueue(tx, {
      to: owner.email,
      template: 'seriesReturned',
      values: { series: series.title, remark, by: editor.name, link: this.addresses.linkTo(`/series/${series.id}`) },
    });
  }

  /** The series, locked, as the caller saw it. @throws {ApiError} CONFLICT when it changed meanwhile */
  private async lockOwn(tx: EntityManager, id: string, viewer: Viewer, seen: number): Promise<Series> {
    const series = await this.findOwn(tx, id, viewer, { mode: 'pessimistic_write' });
    if (series.lockVersion !== seen) {
      throw new ApiError(
        'CONFLICT',
        'Somebody else changed this series meanwhile. Load it again and repeat your change.',
      );
    }
    return series;
  }

  /** Researchers touch their own series, editors all. @throws {ApiError} NOT_FOUND, FORBIDDEN for somebody else's */
  private async findOwn(
    manager: EntityManager,
    id: string,
    viewer: Viewer,
    lock?: { mode: 'pessimistic_write' },
  ): Promise<Series> {
    const series = isId(id) ? await manager.findOne(Series, { where: { id }, ...(lock && { lock }) }) : null;
    if (!series) throw new ApiError('NOT_FOUND', 'There is no such series.');
    if (series.createdById === viewer.id || hasRole(viewer, 'EDITOR')) return series;
    const isHidden = series.status === 'DRAFT' || series.status === 'RETURNED';
    throw isHidden
      ? new ApiError('NOT_FOUND', 'There is no such series.')
      : new ApiError('FORBIDDEN', 'This series belongs to somebody else.');
  }

  /** A series repeats another of its pair, and never, however roundabout, itself. */
  private async sameDataProblems(
    tx: EntityManager,
    sameDataAsId: string | null | undefined,
    pairId: string,
    ownId: string | null = null,
  ): Promise<Problem[]> {
    if (!sameDataAsId) return [];
    const other = isId(sameDataAsId) ? await tx.findOneBy(Series, { id: sameDataAsId, pairId }) : null;
    if (!other) return [problem('BAD_INPUT', 'The series it repeats is not one of this pair.', 'sameDataAsId')];
    const [circle]: object[] = await tx.query(
      `WITH RECURSIVE chain AS (
         SELECT id, same_data_as_id FROM series WHERE id = $1
         UNION SELECT s.id, s.same_data_as_id FROM series s JOIN chain ON s.id = chain.same_data_as_id
       ) SELECT FROM chain WHERE id = $2`,
      [other.id, ownId],
    );
    return circle ? [problem('BAD_INPUT', 'A series does not repeat itself.', 'sameDataAsId')] : [];
  }

  private async record(
    tx: EntityManager,
    series: Series,
    action: string,
    remark: string | null,
    viewer: Viewer,
  ): Promise<void> {
    await tx.query(
      'INSERT INTO series_events (series_id, action, status, remark, person_id) VALUES ($1, $2, $3, $4, $5)',
      [series.id, action, series.status, remark, viewer.id],
    );
  }

  private visibleTo(viewer: Viewer | null) {
    const query = this.dataSource.getRepository(Series).createQueryBuilder('s');
    if (hasRole(viewer, 'EDITOR', 'ADMINISTRATOR')) return query.where('true');
    if (viewer && isOfTheGroup(viewer)) {
      return query.where(
        `(s.created_by_id = :viewerId OR s.status IN ('SUBMITTED', 'ACCEPTED', 'RETIRED') OR ${USED_BY_A_RELEASE})`,
        {
          viewerId: viewer.id,
        },
      );
    }
    return query.where(USED_BY_A_RELEASE);
  }
}

function headerOf(input: CreateSeriesInput | UpdateSeriesInput) {
  return {
    title: input.title.trim(),
    source: input.source.trim(),
    method: input.method.trim(),
    apparatus: input.apparatus?.trim() || null,
    dataOrigin: input.dataOrigin ?? DataOrigin.TABLE,
    commonRelativeUncertainty: input.commonRelativeUncertainty ?? null,
    sameDataAsId: input.sameDataAsId ?? null,
  };
}
