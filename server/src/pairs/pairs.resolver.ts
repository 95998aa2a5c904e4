import { Args, Context, ID, Int, Parent, Query, ResolveField, Resolver } from '@nestjs/graphql';
import { AnyoneMay } from '../common/access.decorators.js';
import { type Connection, connectionOf, pageOf, toConnection } from '../common/graphql/connection.js';
import { loaderFor } from '../common/graphql/loader-for.js';
import { isId } from '../common/graphql/node.js';
import { Substance } from '../substances/substance.entity.js';
import { SubstanceRef } from '../substances/substance.input.js';
import { SubstancesService } from '../substances/substances.service.js';
import { GasPair } from './gas-pair.entity.js';
import { PairsService } from './pairs.service.js';

const GasPairConnection = connectionOf('GasPair', () => GasPair);

@Resolver(() => GasPair)
export class PairsResolver {
  constructor(
    private readonly pairs: PairsService,
    private readonly substancesService: SubstancesService,
  ) {}

  @Query(() => GasPair, { nullable: true })
  @AnyoneMay()
  pair(
    @Args('a', { type: () => SubstanceRef }) a: SubstanceRef,
    @Args('b', { type: () => SubstanceRef }) b: SubstanceRef,
  ): Promise<GasPair | null> {
    return this.pairs.find(a, b);
  }

  @Query(() => GasPair, { nullable: true, description: 'One pair by its id; null when there is none.' })
  @AnyoneMay()
  async pairById(@Args('id', { type: () => ID }) id: string): Promise<GasPair | null> {
    return isId(id) ? this.pairs.findById(id) : null;
  }

  @Query(() => GasPairConnection, { description: 'Gas pairs by words of their names, formulas, synonyms or CAS RN.' })
  @AnyoneMay()
  async gasPairs(
    @Args('search', { type: () => String, nullable: true }) search: string | null,
    @Args('first', { type: () => Int, nullable: true, defaultValue: 25 }) first: number | null,
    @Args('after', { type: () => String, nullable: true }) after: string | null,
  ): Promise<Connection<GasPair>> {
    const page = pageOf(first, after);
    const [rows, count] = await this.pairs.list(search, page);
    return toConnection(rows, count, page);
  }

  @ResolveField(() => [Substance], {
    description: 'Two. The pair is unordered (D_AB = D_BA at low density); this is the order of display.',
  })
  substances(@Parent() pair: GasPair, @Context() context: object): Promise<Substance[]> {
    const loader = loaderFor(context, this.substancesService.byIds);
    return Promise.all([loader.load(pair.firstId), loader.load(pair.secondId)]);
  }
}
