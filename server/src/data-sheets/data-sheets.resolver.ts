import {
  Args,
  Context,
  Field,
  ID,
  Int,
  Mutation,
  ObjectType,
  Parent,
  Query,
  ResolveField,
  Resolver,
} from '@nestjs/graphql';
import { AnyoneMay, RolesMay } from '../common/access.decorators.js';
import { type Connection, connectionOf, pageOf, toConnection } from '../common/graphql/connection.js';
import { loaderFor } from '../common/graphql/loader-for.js';
import { type Outcome, Problem } from '../common/problem.js';
import { CurrentViewer, type Viewer } from '../common/viewer.js';
import { Correlation } from '../fits/correlation.types.js';
import { FitsService } from '../fits/fits.service.js';
import { toCorrelation } from '../fits/correlation-evaluation.js';
import { GasPair } from '../pairs/gas-pair.entity.js';
import { PairsService } from '../pairs/pairs.service.js';
import { SubstanceRef } from '../substances/substance.input.js';
import { DataSheet } from './data-sheet.entity.js';
import { DraftDataSheetInput, UpdateDraftInput } from './data-sheet.input.js';
import { DataSheetVersion } from './data-sheet-version.entity.js';
import { DataSheetsService } from './data-sheets.service.js';
import { DraftingService } from './drafting.service.js';
import { correlationOfVersion } from './version-correlation.js';

export const DataSheetConnection = connectionOf('DataSheet', () => DataSheet);

@ObjectType()
export class DataSheetVersionPayload {
  @Field(() => DataSheetVersion, { nullable: true })
  version: DataSheetVersion | null;
  @Field(() => [Problem])
  problems: Problem[];
}

export function toVersionPayload(outcome: Outcome<DataSheetVersion>): DataSheetVersionPayload {
  return outcome.ok ? { version: outcome.value, problems: [] } : { version: null, problems: outcome.problems };
}

/** Newest entries of a short list. */
const LONGEST_SHORT_LIST = 20;
const shortList = (first: number | null) => Math.min(Math.max(first ?? 3, 0), LONGEST_SHORT_LIST);

@Resolver(() => DataSheet)
export class DataSheetsResolver {
  constructor(
    private readonly sheets: DataSheetsService,
    private readonly drafting: DraftingService,
    private readonly pairs: PairsService,
    private readonly fits: FitsService,
  ) {}

  @Query(() => DataSheetConnection)
  @AnyoneMay()
  async dataSheets(
    @Args('search', { type: () => String, nullable: true }) search: string | null,
    @Args('first', { type: () => Int, nullable: true, defaultValue: 25 }) first: number | null,
    @Args('after', { type: () => String, nullable: true }) after: string | null,
    @CurrentViewer() viewer: Viewer | null,
  ): Promise<Connection<DataSheet>> {
    const page = pageOf(first, after);
    const [rows, count] = await this.sheets.list(search, page, viewer);
    return toConnection(rows, count, page);
  }

  @Query(() => DataSheet, { nullable: true })
  @AnyoneMay()
  dataSheet(@Args('code') code: string, @CurrentViewer() viewer: Viewer | null): Promise<DataSheet | null> {
    return this.sheets.findByCode(code, viewer);
  }

  @Query(() => Correlation, {
    nullable: true,
    description: 'The current released correlation of a pair; null when there is none.',
  })
  @AnyoneMay()
  async correlation(
    @Args('a', { type: () => SubstanceRef }) a: SubstanceRef,
    @Args('b', { type: () => SubstanceRef }) b: SubstanceRef,
    @Context() context: object,
  ): Promise<Correlation | null> {
    const pair = await this.pairs.find(a, b);
    const sheet = pair && (await loaderFor(context, this.sheets.byPairs).load(pair.id));
    const current = sheet && (await this.current(sheet, context));
    if (!current) return null;
    const fit = await loaderFor(context, this.fits.byIds).load(current.fitId);
    return toCorrelation(correlationOfVersion(fit.result, current.validity));
  }

  @Query(() => [DataSheetVersion], { description: 'Current versions over all sheets, newest release first.' })
  @AnyoneMay()
  latestReleases(
    @Args('first', { type: () => Int, nullable: true, defaultValue: 3 }) first: number | null,
  ): Promise<DataSheetVersion[]> {
    return this.sheets.newest('released', shortList(first));
  }

  @Query(() => [DataSheetVersion], { description: 'Withdrawn versions over all sheets, newest first.' })
  @AnyoneMay()
  latestWithdrawals(
    @Args('first', { type: () => Int, nullable: true, defaultValue: 3 }) first: number | null,
  ): Promise<DataSheetVersion[]> {
    return this.sheets.newest('withdrawn', shortList(first));
  }

  @Mutation(() => DataSheetVersionPayload, { description: 'Editors.' })
  @RolesMay('EDITOR')
  async draftDataSheet(
    @Args('input', { type: () => DraftDataSheetInput }) input: DraftDataSheetInput,
    @CurrentViewer() viewer: Viewer,
  ): Promise<DataSheetVersionPayload> {
    return toVersionPayload(await this.drafting.draft(input, viewer));
  }

  @Mutation(() => DataSheetVersionPayload, { description: 'Editors. The words of a draft or returned version.' })
  @RolesMay('EDITOR')
  async updateDraft(
    @Args('input', { type: () => UpdateDraftInput }) input: UpdateDraftInput,
    @CurrentViewer() viewer: Viewer,
  ): Promise<DataSheetVersionPayload> {
    return toVersionPayload(await this.drafting.update(input, viewer));
  }

  @Mutation(() => DataSheetVersionPayload, { description: 'From DRAFT or RETURNED.' })
  @RolesMay('EDITOR')
  async submitForReview(
    @Args('versionId', { type: () => ID }) versionId: string,
    @CurrentViewer() viewer: Viewer,
  ): Promise<DataSheetVersionPayload> {
    return toVersionPayload(await this.drafting.submit(versionId, viewer));
  }

  @ResolveField(() => GasPair)
  pair(@Parent() sheet: DataSheet, @Context() context: object): Promise<GasPair> {
    return loaderFor(context, this.pairs.byIds).load(sheet.pairId);
  }

  @ResolveField(() => DataSheetVersion, {
    nullable: true,
    description: 'The newest released version, if there is one and it is not withdrawn.',
  })
  async current(@Parent() sheet: DataSheet, @Context() context: object): Promise<DataSheetVersion | null> {
    const versions = await loaderFor(context, this.sheets.versionsBySheet).load(sheet.id);
    return versions.find((version) => version.status === 'RELEASED') ?? null;
  }

  @ResolveField(() => DataSheetVersion, {
    nullable: true,
    description: 'One version by its number; null when there is none the caller may see.',
  })
  async version(
    @Parent() sheet: DataSheet,
    @Args('number') number: string,
    @Context() context: object,
    @CurrentViewer() viewer: Viewer | null,
  ): Promise<DataSheetVersion | null> {
    return this.sheets.pickVersion(
      await loaderFor(context, this.sheets.versionsBySheet).load(sheet.id),
      number,
      viewer,
    );
  }

  @ResolveField(() => [DataSheetVersion])
  async versions(
    @Parent() sheet: DataSheet,
    @Context() context: object,
    @CurrentViewer() viewer: Viewer | null,
  ): Promise<DataSheetVersion[]> {
    return this.sheets.visible(await loaderFor(context, this.sheets.versionsBySheet).load(sheet.id), viewer);
  }
}

@Resolver(() => GasPair)
export class PairSheetResolver {
  constructor(private readonly sheets: DataSheetsService) {}

  @ResolveField(() => DataSheet, { nullable: true })
  async dataSheet(
    @Parent() pair: GasPair,
    @Context() context: object,
    @CurrentViewer() viewer: Viewer | null,
  ): Promise<DataSheet | null> {
    const sheet = await loaderFor(context, this.sheets.byPairs).load(pair.id);
    return sheet && this.sheets.findByCode(sheet.code, viewer);
  }
}
