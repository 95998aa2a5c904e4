import { Args, Context, ID, Int, Mutation, Parent, Query, ResolveField, Resolver } from '@nestjs/graphql';
import { AnyoneMay, RolesMay, SignedInMay } from '../common/access.decorators.js';
import { type Connection, connectionOf, pageOf, toConnection } from '../common/graphql/connection.js';
import { loaderFor } from '../common/graphql/loader-for.js';
import { CurrentViewer, isOfTheGroup, type Viewer } from '../common/viewer.js';
import { StoredUpload } from '../files/file.entity.js';
import { FilesService } from '../files/files.service.js';
import { GasPair } from '../pairs/gas-pair.entity.js';
import { PairsService } from '../pairs/pairs.service.js';
import { PeopleService } from '../people/people.service.js';
import { Person } from '../people/person.entity.js';
import { Series, SeriesEvent, SeriesPoint, SeriesStatus } from './series.entity.js';
import { CreateSeriesInput, UpdateSeriesInput } from './series.input.js';
import { SeriesPayload, toSeriesPayload } from './series.payload.js';
import { SeriesPointsStore } from './series-points.store.js';
import { SeriesService } from './series.service.js';

export const SeriesConnection = connectionOf('Series', () => Series);

@Resolver(() => Series)
export class SeriesResolver {
  constructor(
    private readonly seriesService: SeriesService,
    private readonly pointsStore: SeriesPointsStore,
    private readonly pairs: PairsService,
    private readonly people: PeopleService,
    private readonly files: FilesService,
  ) {}

  @Query(() => Series, { nullable: true, description: 'One series; null when there is none the caller may see.' })
  @AnyoneMay()
  oneSeries(
    @Args('id', { type: () => ID }) id: string,
    @CurrentViewer() viewer: Viewer | null,
  ): Promise<Series | null> {
    return this.seriesService.find(id, viewer);
  }

  @Query(() => SeriesConnection, { description: 'The series the caller may see, of all pairs.' })
  @SignedInMay()
  async allSeries(
    @Args('status', { type: () => [SeriesStatus], nullable: true }) statuses: SeriesStatus[] | null,
    @Args('mine', { type: () => Boolean, nullable: true, defaultValue: false }) mine: boolean | null,
    @Args('first', { type: () => Int, nullable: true, defaultValue: 25 }) first: number | null,
    @Args('after', { type: () => String, nullable: true }) after: string | null,
    @CurrentViewer() viewer: Viewer,
  ): Promise<Connection<Series>> {
    const page = pageOf(first, after);
    const [rows, count] = await this.seriesService.list(
      { statuses, ...(mine && { createdById: viewer.id }) },
      page,
      viewer,
    );
    return toConnection(rows, count, page);
  }

  @ResolveField(() => GasPair)
  pair(@Parent() series: Series, @Context() context: object): Promise<GasPair> {
    return loaderFor(context, this.pairs.byIds).load(series.pairId);
  }

  @ResolveField(() => Series, {
    nullable: true,
    description: 'The series whose data this one repeats; both never carry weight together.',
  })
  async sameDataAs(@Parent() series: Series, @CurrentViewer() viewer: Viewer | null): Promise<Series | null> {
    return series.sameDataAsId ? this.seriesService.find(series.sameDataAsId, viewer) : null;
  }

  @ResolveField(() => [SeriesPoint])
  points(@Parent() series: Series, @Context() context: object): Promise<SeriesPoint[]> {
    return loaderFor(context, this.pointsStore.bySeries).load(series.id);
  }

  @ResolveField(() => StoredUpload, {
    nullable: true,
    description: 'The file it was read from; null where there is none the caller may see.',
  })
  async file(@Parent() series: Series, @CurrentViewer() viewer: Viewer | null): Promise<StoredUpload | null> {
    return series.fileId && viewer ? this.files.findVisible(series.fileId, viewer) : null;
  }

  @ResolveField(() => Int, {
    description: 'Place among all series of its pair, from 0; gives its letter, colour and shape for ever.',
  })
  ordinal(@Parent() series: Series, @Context() context: object): Promise<number> {
    return loaderFor(context, this.seriesService.ordinals).load(series.id);
  }

  @ResolveField(() => Person, { nullable: true })
  async submittedBy(@Parent() series: Series, @Context() context: object): Promise<Person | null> {
    return series.submittedById ? loaderFor(context, this.people.byIds).load(series.submittedById) : null;
  }

  @ResolveField(() => Person, { nullable: true, description: 'Who brought it in; for members of the group.' })
  async createdBy(
    @Parent() series: Series,
    @Context() context: object,
    @CurrentViewer() viewer: Viewer | null,
  ): Promise<Person | null> {
    return isOfTheGroup(viewer) ? loaderFor(context, this.people.byIds).load(series.createdById) : null;
  }

  @ResolveField(() => [SeriesEvent], { description: 'Changes of state, oldest first; for members of the group.' })
  async events(
    @Parent() series: Series,
    @Context() context: object,
    @CurrentViewer() viewer: Viewer | null,
  ): Promise<SeriesEvent[]> {
    return isOfTheGroup(viewer) ? loaderFor(context, this.seriesService.eventsBySeries).load(series.id) : [];
  }

  @Mutation(() => SeriesPayload, { description: 'Researchers and editors.' })
  @RolesMay('RESEARCHER', 'EDITOR')
  async createSeries(
    @Args('input', { type: () => CreateSeriesInput }) input: CreateSeriesInput,
    @CurrentViewer() viewer: Viewer,
  ): Promise<SeriesPayload> {
    return toSeriesPayload(await this.seriesService.createFromApi(input, viewer));
  }

  @Mutation(() => SeriesPayload, { description: 'Its owner and editors; from DRAFT or RETURNED.' })
  @RolesMay('RESEARCHER', 'EDITOR')
  async updateSeries(
    @Args('input', { type: () => UpdateSeriesInput }) input: UpdateSeriesInput,
    @CurrentViewer() viewer: Viewer,
  ): Promise<SeriesPayload> {
    return toSeriesPayload(await this.seriesService.update(input, viewer));
  }

  @Mutation(() => SeriesPayload, { description: 'From DRAFT or RETURNED.' })
  @RolesMay('RESEARCHER', 'EDITOR')
  async submitSeries(
    @Args('id', { type: () => ID }) id: string,
    @CurrentViewer() viewer: Viewer,
  ): Promise<SeriesPayload> {
    return toSeriesPayload(await this.seriesService.submit(id, viewer));
  }

  @Mutation(() => SeriesPayload, { description: 'Editors; not the submitter.' })
  @RolesMay('EDITOR')
  async acceptSeries(
    @Args('id', { type: () => ID }) id: string,
    @CurrentViewer() viewer: Viewer,
  ): Promise<SeriesPayload> {
    return toSeriesPayload(await this.seriesService.accept(id, viewer));
  }

  @Mutation(() => SeriesPayload)
  @RolesMay('EDITOR')
  async returnSeries(
    @Args('id', { type: () => ID }) id: string,
    @Args('remark') remark: string,
    @CurrentViewer() viewer: Viewer,
  ): Promise<SeriesPayload> {
    return toSeriesPayload(await this.seriesService.giveBack(id, remark, viewer));
  }

  @Mutation(() => SeriesPayload, { description: 'Editors; from ACCEPTED, with the reason.' })
  @RolesMay('EDITOR')
  async retireSeries(
    @Args('id', { type: () => ID }) id: string,
    @Args('remark') remark: string,
    @CurrentViewer() viewer: Viewer,
  ): Promise<SeriesPayload> {
    return toSeriesPayload(await this.seriesService.retire(id, remark, viewer));
  }
}

@Resolver(() => SeriesEvent)
export class SeriesEventsResolver {
  constructor(private readonly people: PeopleService) {}

  @ResolveField(() => Person)
  person(@Parent() event: SeriesEvent, @Context() context: object): Promise<Person> {
    return loaderFor(context, this.people.byIds).load(event.personId);
  }
}

@Resolver(() => GasPair)
export class PairSeriesResolver {
  constructor(private readonly seriesService: SeriesService) {}

  @ResolveField(() => SeriesConnection)
  async series(
    @Parent() pair: GasPair,
    @Args('status', { type: () => [SeriesStatus], nullable: true }) statuses: SeriesStatus[] | null,
    @Args('first', { type: () => Int, nullable: true }) first: number | null,
    @Args('after', { type: () => String, nullable: true }) after: string | null,
    @CurrentViewer() viewer: Viewer | null,
  ): Promise<Connection<Series>> {
    const page = pageOf(first, after, 100);
    const [rows, count] = await this.seriesService.list({ pairId: pair.id, statuses }, page, viewer);
    return toConnection(rows, count, page);
  }
}
