import { type INestApplicationContext } from '@nestjs/common';
import { DataSource } from 'typeorm';
import { PasswordsService } from '../../src/auth/passwords.service.js';
import { type Outcome } from '../../src/common/problem.js';
import { type Viewer } from '../../src/common/viewer.js';
import { DataSheet } from '../../src/data-sheets/data-sheet.entity.js';
import { DataSheetVersion } from '../../src/data-sheets/data-sheet-version.entity.js';
import { DraftingService } from '../../src/data-sheets/drafting.service.js';
import { Fit } from '../../src/fits/fit.entity.js';
import { type FitCorrelationInput } from '../../src/fits/fit.input.js';
import { FitsService } from '../../src/fits/fits.service.js';
import { PairsService } from '../../src/pairs/pairs.service.js';
import { Person } from '../../src/people/person.entity.js';
import { ReleasesService } from '../../src/releases/releases.service.js';
import { ReviewsService } from '../../src/reviews/reviews.service.js';
import { type Series } from '../../src/series/series.entity.js';
import { type CreateSeriesInput } from '../../src/series/series.input.js';
import { pointId } from '../../src/series/series-points.store.js';
import { SeriesService } from '../../src/series/series.service.js';
import { SubscriptionsService } from '../../src/subscriptions/subscriptions.service.js';
import { type DemoPersonKey, type DemoSeries, type DemoSheet, type DemoVersion } from './data/demo.types.js';
import { demoScenario } from './data/scenario.js';

export const DEMO_PASSWORD = 'diffolio-demo';
const DEMO = 'demo';

function must<T>(outcome: Outcome<T>): T {
  if (outcome.ok) return outcome.value;
  throw new Error(
    `the demo was refused: ${outcome.problems.map((problem) => `${problem.code} ${problem.message}`).join('; ')}`,
  );
}

/** Plays the demo scenario through the services, as people would; a part that is there already is not played again. */
export class DemoSeeder {
  private readonly dataSource: DataSource;
  private readonly viewers = new Map<DemoPersonKey, Viewer>();
  private readonly seriesByKey = new Map<string, Series>();
  private readonly scenario = demoScenario();

  constructor(private readonly app: INestApplicationContext) {
    this.dataSource = app.get(DataSource);
  }

  async seed(): Promise<void> {
    const [finished]: object[] = await this.dataSource.query('SELECT FROM seeds WHERE name = $1', [DEMO]);
    if (finished) return;
    await this.seedPeople();
    for (const sheet of this.scenario.sheets) await this.playSheet(sheet);
    for (const series of this.scenario.series) await this.bringIn(series);
    await this.dataSource.query('INSERT INTO seeds (name) VALUES ($1) ON CONFLICT DO NOTHING', [DEMO]);
  }

  private async seedPeople(): Promise<void> {
    const people = this.dataSource.getRepository(Person);
    const passwordHash = await this.app.get(PasswordsService).hash(DEMO_PASSWORD);
    for (const { key, name, email, roles } of this.scenario.people) {
      const known = await people.findOneBy({ email });
      const person =
        known ?? (await people.save(people.create({ name, email, roles: [...roles], orcid: null, passwordHash })));
      this.viewers.set(key, { id: person.id, roles: [...roles], viaApiKey: false });
    }
  }

  private viewer(key: DemoPersonKey): Viewer {
    const viewer = this.viewers.get(key);
    if (!viewer) throw new Error(`no demo person ${key}`);
    return viewer;
  }

  /** Brings a series in and takes it to its fate. */
  private async bringIn(demo: DemoSeries): Promise<Series> {
    const known = this.seriesByKey.get(demo.key);
    if (known) return known;
    const series = this.app.get(SeriesService);
    const owner = this.viewer(demo.owner);
    let kept = await this.findSeries(demo, owner);
    if (!kept) {
      const original = this.scenario.series.find((other) => other.key === demo.sameDataAs);
      const sameDataAsId = original ? (await this.bringIn(original)).id : null;
      kept = must(await series.create(toInput(demo, sameDataAsId), owner, null));
    }
    if (kept.status === 'DRAFT' && demo.fate !== 'draft') kept = must(await series.submit(kept.id, owner));
    if (kept.status === 'SUBMITTED' && demo.fate === 'accepted')
      kept = must(await series.accept(kept.id, this.viewer('editor')));
    if (kept.status === 'SUBMITTED' && demo.fate === 'returned') {
      kept = must(await series.giveBack(kept.id, demo.remark ?? '', this.viewer('editor')));
    }
    this.seriesByKey.set(demo.key, kept);
    return kept;
  }

  private async findSeries(demo: DemoSeries, owner: Viewer): Promise<Series | null> {
    const [rows] = await this.app.get(SeriesService).list({ createdById: owner.id }, null, owner);
    return rows.find((row) => row.title === demo.title && row.source === demo.source) ?? null;
  }

  private async playSheet({ pair, versions }: DemoSheet): Promise<void> {
    const done = await this.versionsOf(pair.a, pair.b);
    for (const [i, version] of versions.entries()) {
      for (const key of [...version.seriesKeys, ...version.leftOutSeries.map((left) => left.seriesKey)]) {
        await this.bringIn(this.series(key));
      }
      await this.playVersion(version, pair, done[i] ?? null);
    }
  }

  private series(key: string): DemoSeries {
    const series = this.scenario.series.find((candidate) => candidate.key === key);
    if (!series) throw new Error(`no demo series ${key}`);
    return series;
  }

  private async versionsOf(a: string, b: string): Promise<DataSheetVersion[]> {
    const pair = await this.app.get(PairsService).find({ name: a }, { name: b });
    const sheet = pair && (await this.dataSource.manager.findOneBy(DataSheet, { pairId: pair.id }));
    if (!sheet) return [];
    return this.dataSource.manager.find(DataSheetVersion, {
      where: { dataSheetId: sheet.id },
      order: { createdAt: 'ASC' },
    });
  }

  private async playVersion(
    demo: DemoVersion,
    pair: { a: string; b: string },
    known: DataSheetVersion | null,
  ): Promise<void> {
    const editor = this.viewer('editor');
    const second = this.viewer('editor2');
    let version = known ?? (await this.draft(demo, pair, editor));
    if (version.status === 'DRAFT') version = must(await this.app.get(DraftingService).submit(version.id, editor));
    if (demo.fate === 'inReview') return;
    if (version.status === 'IN_REVIEW') {
      const remark = 'Reproduced; the exclusions hold whatever the result.';
      version = must(
        await this.app.get(ReviewsService).record({ versionId: version.id, verdict: 'APPROVE', remark }, second),
      );
    }
    const releases = this.app.get(ReleasesService);
    if (version.status === 'APPROVED') version = must(await releases.release(version.id, DEMO_PASSWORD, second));
    await this.app.get(SubscriptionsService).subscribe(this.viewer('modeller').id, version.dataSheetId);
    if (demo.fate === 'withdrawn' && version.status === 'RELEASED') {
      must(await releases.withdraw(version.id, demo.withdrawalReason ?? '', DEMO_PASSWORD, second));
    }
  }

  private async draft(demo: DemoVersion, pair: { a: string; b: string }, editor: Viewer): Promise<DataSheetVersion> {
    const found = await this.app.get(PairsService).find({ name: pair.a }, { name: pair.b });
    if (!found) throw new Error(`no pair ${pair.a} + ${pair.b}`);
    const input = this.fitInput(demo, found.id);
    const fits = this.app.get(FitsService);
    const kept = (await fits.listOfPair(found.id)).find((fit) => isOfRecipe(fit, input));
    const fit = kept ?? must(await fits.keep(input, editor));
    const { summary, changeNote } = demo;
    return must(await this.app.get(DraftingService).draft({ fitId: fit.id, summary, changeNote }, editor));
  }

  private fitInput(demo: DemoVersion, pairId: string): FitCorrelationInput {
    const idOf = (key: string) => this.seriesByKey.get(key)?.id ?? '';
    return {
      pairId,
      ...demo.recipe,
      seriesIds: demo.seriesKeys.map(idOf),
      excludedPoints: demo.excludedPoints.map(({ seriesKey, index, reason }) => ({
        pointId: pointId(idOf(seriesKey), index),
        reason,
      })),
      leftOutSeries: demo.leftOutSeries.map(({ seriesKey, reason }) => ({ seriesId: idOf(seriesKey), reason })),
    } as FitCorrelationInput;
  }
}

/** Is the kept fit the one this input would make? A version of words only shares the fit of the one before. */
function isOfRecipe(fit: Fit, input: FitCorrelationInput): boolean {
  const used = new Set(fit.result.seriesOffsets.map((offset) => offset.key));
  const wanted = input.seriesIds ?? [];
  return (
    fit.recipe.form === String(input.form) &&
    used.size === wanted.length &&
    wanted.every((id) => used.has(id)) &&
    fit.excluded.length === (input.excludedPoints?.length ?? 0)
  );
}

function toInput(demo: DemoSeries, sameDataAsId: string | null): CreateSeriesInput {
  const { a, b, title, source, method, apparatus, dataOrigin, commonRelativeUncertainty, points } = demo;
  return {
    a: { name: a },
    b: { name: b },
    title,
    source,
    method,
    apparatus,
    dataOrigin,
    commonRelativeUncertainty,
    sameDataAsId,
    points: points.map((point) => ({ ...point })),
  } as CreateSeriesInput;
}
