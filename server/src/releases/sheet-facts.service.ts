import { Injectable } from '@nestjs/common';
import { DataSource, EntityManager, In } from 'typeorm';
import { DataSheet } from '../data-sheets/data-sheet.entity.js';
import { DataSheetVersion } from '../data-sheets/data-sheet-version.entity.js';
import { correlationOfVersion } from '../data-sheets/version-correlation.js';
import { formatNumber, isReleased } from '../data-sheets/version-rules.js';
import { skippedIn } from '../fits/fit-choice.js';
import { Fit } from '../fits/fit.entity.js';
import { type FitWithPoints, FitsService } from '../fits/fits.service.js';
import { estimatesOf } from '../fits/pair-estimates.js';
import { seriesOffset } from '../numerics/fitting/series-offsets.js';
import { GasPair } from '../pairs/gas-pair.entity.js';
import { Person } from '../people/person.entity.js';
import { approvalsInForce } from '../reviews/review-rules.js';
import { Review } from '../reviews/review.entity.js';
import { Series, type SeriesPoint } from '../series/series.entity.js';
import {
  type PointColumns,
  type SeriesFacts,
  type SheetFacts,
  type StandingFacts,
  type SubstanceFacts,
  type VersionFacts,
} from '../sheet-documents/sheet-facts.js';
import { Substance } from '../substances/substance.entity.js';
import { Release } from './release.entity.js';

const iso = (date: Date | null | undefined): string | null => date?.toISOString() ?? null;

function toColumns(points: readonly SeriesPoint[]): PointColumns {
  return {
    temperatures: points.map((point) => point.temperature),
    pressures: points.map((point) => point.pressure),
    pressureOrigins: points.map((point) => point.pressureOrigin),
    diffusivities: points.map((point) => point.diffusivity),
    diffusivityUncertainties: points.map((point) => point.diffusivityUncertainty),
    uncertaintyOrigins: points.map((point) => point.uncertaintyOrigin),
    temperatureUncertainties: points.map((point) => point.temperatureUncertainty),
    pressureUncertainties: points.map((point) => point.pressureUncertainty),
    moleFractions: points.map((point) => point.moleFraction),
    replicates: points.map((point) => point.replicates),
  };
}

function toSubstanceFacts({ name, formula, casNumber, molarMass, cautions }: Substance): SubstanceFacts {
  return { name, formula, casNumber, molarMass, cautions: cautions.map((caution) => caution.text) };
}

/** Gathers what a version's sheet is made from: its words, fit, series, people and how it stands. */
@Injectable()
export class SheetFactsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly fits: FitsService,
  ) {}

  async factsOf(version: DataSheetVersion, manager: EntityManager = this.dataSource.manager): Promise<SheetFacts> {
    const sheet = await manager.findOneByOrFail(DataSheet, { id: version.dataSheetId });
    const fit = await manager.findOneByOrFail(Fit, { id: version.fitId });
    const substances = await this.substancesOf(manager, sheet.pairId);
    const versions = await this.versionsOf(manager, version);
    const release = await manager.findOneBy(Release, { versionId: version.id });
    const { number, createdAt, engineVersion, recipe, result } = fit;
    return {
      code: sheet.code,
      number: formatNumber(version),
      substances: [toSubstanceFacts(substances[0]), toSubstanceFacts(substances[1])],
      correlation: correlationOfVersion(result, version.validity),
      fit: { number, createdAt: createdAt.toISOString(), engineVersion, recipe, statistics: result.statistics },
      series: await this.seriesFacts(manager, await this.fits.withPoints(fit, manager)),
      estimates: estimatesOf(...substances),
      words: { summary: version.summary, changeNote: version.changeNote, remarks: wordsOf(version) },
      people: await this.peopleOf(manager, version, release),
      releasedAt: iso(release?.releasedAt),
      doi: release?.doi ?? null,
      replaces: replacedNumber(versions, formatNumber(version)),
      standing: await this.standingOf(version, release, manager),
      versions,
    };
  }

  /** How a version stands today. */
  async standingOf(
    version: DataSheetVersion,
    release: Release | null,
    manager: EntityManager = this.dataSource.manager,
  ): Promise<StandingFacts> {
    const successor = version.supersededById
      ? await manager.findOneBy(DataSheetVersion, { id: version.supersededById })
      : null;
    return {
      status: version.status,
      contentHash: release?.contentHash ?? null,
      previousHash: release?.previousHash ?? null,
      supersededBy: successor && formatNumber(successor),
      withdrawnAt: iso(version.withdrawnAt),
      withdrawalReason: version.withdrawalReason,
    };
  }

  /** The released versions of the version's sheet and the version itself, newest first. */
  async versionsOf(manager: EntityManager, version: DataSheetVersion): Promise<VersionFacts[]> {
    const all = await manager.find(DataSheetVersion, {
      where: { dataSheetId: version.dataSheetId },
      order: { edition: 'DESC', revision: 'DESC', createdAt: 'DESC' },
    });
    const listed = all.filter((other) => other.id === version.id || isReleased(other.status));
    const releases = await manager.findBy(Release, { versionId: In(listed.map((other) => other.id)) });
    return listed.map((other) => ({
      number: formatNumber(other),
      status: other.status,
      releasedAt: iso(releases.find((release) => release.versionId === other.id)?.releasedAt),
      withdrawnAt: iso(other.withdrawnAt),
      summary: other.summary,
      changeNote: other.changeNote,
    }));
  }

  private async substancesOf(manager: EntityManager, pairId: string): Promise<[Substance, Substance]> {
    const pair = await manager.findOneByOrFail(GasPair, { id: pairId });
    return [
      await manager.findOneByOrFail(Substance, { id: pair.firstId }),
      await manager.findOneByOrFail(Substance, { id: pair.secondId }),
    ];
  }

  private async seriesFacts(
    manager: EntityManager,
    { fit, used, leftOut, points }: FitWithPoints,
  ): Promise<SeriesFacts[]> {
    const ordinals = await ordinalsOf(manager, fit.pairId);
    const reasons = new Map(fit.leftOut.map(({ seriesId, reason }) => [seriesId, reason]));
    return [...used, ...leftOut]
      .map((series) => {
        const own = points.get(series.id) ?? [];
        const skipped = skippedIn(fit.excluded, series.id);
        const known = fit.result.seriesOffsets.find((offset) => offset.key === series.id);
        const { commonRelativeUncertainty } = series;
        const offset = known ?? seriesOffset(fit.result, { key: series.id, commonRelativeUncertainty, points: own });
        return {
          ordinal: ordinals.get(series.id) ?? 0,
          title: series.title,
          source: series.source,
          method: series.method,
          apparatus: series.apparatus,
          dataOrigin: series.dataOrigin,
          commonRelativeUncertainty,
          points: toColumns(own),
          excluded: fit.excluded
            .filter((point) => point.seriesId === series.id && skipped.has(point.index))
            .map(({ index, reason }) => ({ index, reason })),
          offset: { value: offset.offset, standardUncertainty: offset.standardUncertainty },
          leftOutBecause: reasons.get(series.id) ?? null,
        };
      })
      .sort((a, b) => a.ordinal - b.ordinal);
  }

  private async peopleOf(
    manager: EntityManager,
    version: DataSheetVersion,
    release: Release | null,
  ): Promise<SheetFacts['people']> {
    const reviews = await manager.find(Review, {
      where: { versionId: version.id },
      order: { createdAt: 'ASC', id: 'ASC' },
    });
    const approvals = approvalsInForce(reviews);
    const ids = [
      version.preparedById,
      ...approvals.map((review) => review.reviewerId),
      ...(release ? [release.releasedById] : []),
    ];
    const people = await manager.findBy(Person, { id: In(ids) });
    const nameOf = (id: string) => people.find((person) => person.id === id)?.name ?? '';
    return {
      preparedBy: nameOf(version.preparedById),
      reviewedBy: [...new Set(approvals.map((review) => nameOf(review.reviewerId)))],
      releasedBy: release && nameOf(release.releasedById),
    };
  }
}

/** Place of each series among all of its pair, in the order they came; it gives its letter, colour and shape for ever. */
async function ordinalsOf(manager: EntityManager, pairId: string): Promise<Map<string, number>> {
  const all = await manager.find(Series, {
    select: { id: true },
    where: { pairId },
    order: { createdAt: 'ASC', id: 'ASC' },
  });
  return new Map(all.map((series, i) => [series.id, i]));
}

/** The editor's words by section; the reason for a stated range in P stands with the correlation. */
function wordsOf(version: DataSheetVersion): Record<string, string> {
  if (!version.validity) return version.remarks;
  const own = version.remarks['correlation'];
  return { ...version.remarks, correlation: own ? `${own} ${version.validity.reason}` : version.validity.reason };
}

/** The version that stood before this one. */
function replacedNumber(versions: readonly VersionFacts[], number: string): string | null {
  const earlier = versions.slice(versions.findIndex((version) => version.number === number) + 1);
  return earlier.find((version) => version.releasedAt !== null)?.number ?? null;
}
