import { Args, Context, Float, Parent, ResolveField, Resolver } from '@nestjs/graphql';
import { ApiError } from '../common/api-error.js';
import { loaderFor } from '../common/graphql/loader-for.js';
import { CurrentViewer, isOfTheGroup, type Viewer } from '../common/viewer.js';
import { GasPair } from '../pairs/gas-pair.entity.js';
import { SubstancesService } from '../substances/substances.service.js';
import { MOST_STATES } from './correlation-evaluation.js';
import { Fit } from './fit.entity.js';
import { PairEstimate } from './fit.types.js';
import { FitsService } from './fits.service.js';
import { estimatesAlong } from './pair-estimates.js';

@Resolver(() => GasPair)
export class PairFitsResolver {
  constructor(
    private readonly fitsService: FitsService,
    private readonly substances: SubstancesService,
  ) {}

  @ResolveField(() => [Fit], { description: 'Newest first; for members of the group.' })
  async fits(@Parent() pair: GasPair, @CurrentViewer() viewer: Viewer | null): Promise<Fit[]> {
    return isOfTheGroup(viewer) ? this.fitsService.listOfPair(pair.id) : [];
  }

  @ResolveField(() => [PairEstimate], {
    description: 'Estimates of kinetic theory beside the measurements; never part of a fit.',
  })
  async estimates(
    @Parent() pair: GasPair,
    @Args('temperatures', { type: () => Float64Array, description: 'K' }) temperatures: Float64Array,
    @Args('pressure', { type: () => Float, nullable: true, defaultValue: 101_325, description: 'Pa' })
    pressure: number | null,
    @Context() context: object,
  ): Promise<PairEstimate[]> {
    const state = pressure ?? 101_325;
    if (temperatures.length > MOST_STATES || !temperatures.every((T) => T > 0) || !(state > 0)) {
      throw new ApiError('BAD_USER_INPUT', `Give at most ${MOST_STATES} temperatures, and states above zero.`);
    }
    const loader = loaderFor(context, this.substances.byIds);
    const [a, b] = await Promise.all([loader.load(pair.firstId), loader.load(pair.secondId)]);
    return estimatesAlong(a, b, temperatures, state);
  }
}
