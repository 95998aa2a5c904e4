import { Args, Context, Float, ID, Mutation, Parent, Query, ResolveField, Resolver } from '@nestjs/graphql';
import { AnyoneMay, RolesMay } from '../common/access.decorators.js';
import { ApiError } from '../common/api-error.js';
import { loaderFor } from '../common/graphql/loader-for.js';
import { Warning } from '../common/problem.js';
import { CurrentViewer, isOfTheGroup, type Viewer } from '../common/viewer.js';
import { GasPair } from '../pairs/gas-pair.entity.js';
import { PairsService } from '../pairs/pairs.service.js';
import { PeopleService } from '../people/people.service.js';
import { Person } from '../people/person.entity.js';
import { Series } from '../series/series.entity.js';
import { pointId, SeriesPointsStore } from '../series/series-points.store.js';
import { SeriesService } from '../series/series.service.js';
import { evaluate, toCorrelation } from './correlation-evaluation.js';
import { Correlation, Evaluation, OutsideRange, UncertaintyKind } from './correlation.types.js';
import { Fit } from './fit.entity.js';
import { FitCorrelationInput, Loss, Objective, SeriesEffect, Weighting } from './fit.input.js';
import {
  ExcludedPoint,
  FitAnalysis,
  FitPayload,
  FitPreviewPayload,
  FitStatistics,
  LeftOutSeries,
  SeriesAnalysis,
  SeriesOffset,
} from './fit.types.js';
import { FitsService } from './fits.service.js';

/** Of expanded uncertainties, where a request does not say. */
const USUAL_COVERAGE = 0.95;

@Resolver(() => Fit)
export class FitsResolver {
  constructor(
    private readonly fits: FitsService,
    private readonly seriesService: SeriesService,
    private readonly pointsStore: SeriesPointsStore,
    private readonly pairs: PairsService,
    private readonly people: PeopleService,
  ) {}

  @Query(() => Fit, { nullable: true, description: 'One fit; null when there is none the caller may see.' })
  @AnyoneMay()
  fit(@Args('id', { type: () => ID }) id: string, @CurrentViewer() viewer: Viewer | null): Promise<Fit | null> {
    return this.fits.find(id, viewer);
  }

  @Query(() => FitPreviewPayload, { description: 'Researchers and editors. Computes a fit without keeping it.' })
  @RolesMay('RESEARCHER', 'EDITOR')
  async previewFit(
    @Args('input', { type: () => FitCorrelationInput }) input: FitCorrelationInput,
  ): Promise<FitPreviewPayload> {
    const outcome = await this.fits.preview(input);
    return outcome.ok ? { analysis: outcome.value, problems: [] } : { analysis: null, problems: outcome.problems };
  }

  @Mutation(() => FitPayload, { description: 'Researchers and editors; accepted series only.' })
  @RolesMay('RESEARCHER', 'EDITOR')
  async fitCorrelation(
    @Args('input', { type: () => FitCorrelationInput }) input: FitCorrelationInput,
    @CurrentViewer() viewer: Viewer,
  ): Promise<FitPayload> {
    const outcome = await this.fits.keep(input, viewer);
    return outcome.ok ? { fit: outcome.value, problems: [] } : { fit: null, problems: outcome.problems };
  }

  @ResolveField(() => GasPair)
  pair(@Parent() fit: Fit, @Context() context: object): Promise<GasPair> {
    return loaderFor(context, this.pairs.byIds).load(fit.pairId);
  }

  @ResolveField(() => Correlation)
  correlation(@Parent() fit: Fit): Correlation {
    return toCorrelation(fit.result);
  }

  @ResolveField(() => FitStatistics)
  statistics(@Parent() fit: Fit): FitStatistics {
    return fit.result.statistics;
  }

  @ResolveField(() => Objective)
  objective(@Parent() fit: Fit): string {
    return fit.recipe.objective;
  }

  @ResolveField(() => Weighting)
  weighting(@Parent() fit: Fit): string {
    return fit.recipe.weighting;
  }

  @ResolveField(() => Loss)
  loss(@Parent() fit: Fit): string {
    return fit.recipe.loss;
  }

  @ResolveField(() => SeriesEffect)
  seriesEffect(@Parent() fit: Fit): string {
    return fit.recipe.seriesEffect;
  }

  @ResolveField(() => [Series])
  async series(@Parent() fit: Fit, @Context() context: object): Promise<Series[]> {
    const ids = await loaderFor(context, this.fits.seriesIdsByFit).load(fit.id);
    const loader = loaderFor(context, this.seriesService.byIds);
    return Promise.all(ids.map((id) => loader.load(id)));
  }

  @ResolveField(() => [SeriesOffset])
  seriesOffsets(@Parent() fit: Fit): SeriesOffset[] {
    return fit.result.seriesOffsets;
  }

  @ResolveField(() => [ExcludedPoint])
  async excludedPoints(@Parent() fit: Fit, @Context() context: object): Promise<ExcludedPoint[]> {
    const loader = loaderFor(context, this.pointsStore.bySeries);
    return Promise.all(
      fit.excluded.map(async ({ seriesId, index, reason }) => {
        const point = (await loader.load(seriesId))[index];
        if (!point) throw new Error(`point ${pointId(seriesId, index)} of fit ${fit.id} is not there`);
        return { seriesId, reason, point };
      }),
    );
  }

  @ResolveField(() => [LeftOutSeries], {
    description: 'Accepted series of the pair that carried no weight; for members of the group.',
  })
  leftOutSeries(@Parent() fit: Fit, @CurrentViewer() viewer: Viewer | null): LeftOutSeries[] {
    return isOfTheGroup(viewer) ? fit.leftOut : [];
  }

  @ResolveField(() => [Warning])
  warnings(@Parent() fit: Fit): Warning[] {
    return fit.result.warnings;
  }

  @ResolveField(() => FitAnalysis, {
    description: 'All that the workspace shows of the fit; for members of the group.',
  })
  analysis(@Parent() fit: Fit, @CurrentViewer() viewer: Viewer | null): Promise<FitAnalysis> {
    if (!isOfTheGroup(viewer)) throw new ApiError('FORBIDDEN', 'Only members of the group see the analysis of a fit.');
    return this.fits.analysisOf(fit);
  }

  @ResolveField(() => Person, { nullable: true })
  createdBy(@Parent() fit: Fit, @Context() context: object): Promise<Person | null> {
    return loaderFor(context, this.people.byIds).load(fit.createdById);
  }
}

@Resolver(() => Correlation)
export class CorrelationsResolver {
  @ResolveField(() => Evaluation, {
    description: 'Columns of equal length, at most 10,000; a single pressure may serve all temperatures.',
  })
  evaluate(
    @Parent() correlation: Correlation,
    @Args('temperatures', { type: () => Float64Array, description: 'K' }) temperatures: Float64Array,
    @Args('pressures', { type: () => Float64Array, description: 'Pa' }) pressures: Float64Array,
    @Args('coverage', { type: () => Float, nullable: true, defaultValue: USUAL_COVERAGE }) coverage: number | null,
    @Args('kind', { type: () => UncertaintyKind, nullable: true, defaultValue: UncertaintyKind.MEAN })
    kind: UncertaintyKind | null,
    @Args('outsideRange', {
      type: () => OutsideRange,
      nullable: true,
      defaultValue: OutsideRange.FLAG,
      description: 'REFUSE: error OUT_OF_RANGE',
    })
    outsideRange: OutsideRange | null,
  ): Evaluation {
    return evaluate(correlation.evaluable, {
      temperatures,
      pressures,
      coverage: coverage ?? USUAL_COVERAGE,
      kind: kind ?? UncertaintyKind.MEAN,
      outsideRange: outsideRange ?? OutsideRange.FLAG,
    });
  }
}

@Resolver(() => SeriesOffset)
export class SeriesOffsetsResolver {
  constructor(private readonly seriesService: SeriesService) {}

  @ResolveField(() => Series)
  series(@Parent() offset: SeriesOffset, @Context() context: object): Promise<Series> {
    return loaderFor(context, this.seriesService.byIds).load(offset.key);
  }
}

@Resolver(() => ExcludedPoint)
export class ExcludedPointsResolver {
  constructor(private readonly seriesService: SeriesService) {}

  @ResolveField(() => Series)
  series(@Parent() excluded: ExcludedPoint, @Context() context: object): Promise<Series> {
    return loaderFor(context, this.seriesService.byIds).load(excluded.seriesId);
  }
}

@Resolver(() => LeftOutSeries)
export class LeftOutSeriesResolver {
  constructor(private readonly seriesService: SeriesService) {}

  @ResolveField(() => Series)
  series(@Parent() leftOut: LeftOutSeries, @Context() context: object): Promise<Series> {
    return loaderFor(context, this.seriesService.byIds).load(leftOut.seriesId);
  }
}

@Resolver(() => SeriesAnalysis)
export class SeriesAnalysesResolver {
  constructor(private readonly seriesService: SeriesService) {}

  @ResolveField(() => Series)
  series(@Parent() analysis: SeriesAnalysis, @Context() context: object): Promise<Series> {
    return loaderFor(context, this.seriesService.byIds).load(analysis.seriesId);
  }
}
