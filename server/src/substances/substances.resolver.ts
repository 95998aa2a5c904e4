import { Args, Field, Int, Mutation, ObjectType, Parent, Query, ResolveField, Resolver } from '@nestjs/graphql';
import { AnyoneMay, RolesMay } from '../common/access.decorators.js';
import { type Connection, connectionOf, pageOf, toConnection } from '../common/graphql/connection.js';
import { Problem } from '../common/problem.js';
import { CurrentViewer, type Viewer } from '../common/viewer.js';
import { CONSTANT_KINDS } from '../numerics/estimates/constant-kinds.js';
import { Substance, SubstanceConstant } from './substance.entity.js';
import { SubstanceInput, SubstanceRef, UpdateSubstanceInput } from './substance.input.js';
import { SubstancesService } from './substances.service.js';

const SubstanceConnection = connectionOf('Substance', () => Substance);

@ObjectType()
export class SubstancePayload {
  @Field(() => Substance, { nullable: true })
  substance: Substance | null;
  @Field(() => [Problem])
  problems: Problem[];
}

@Resolver(() => Substance)
export class SubstancesResolver {
  constructor(private readonly substances: SubstancesService) {}

  @Query(() => SubstanceConnection, { name: 'substances' })
  @AnyoneMay()
  async list(
    @Args('search', { type: () => String, nullable: true }) search: string | null,
    @Args('first', { type: () => Int, nullable: true, defaultValue: 25 }) first: number | null,
    @Args('after', { type: () => String, nullable: true }) after: string | null,
  ): Promise<Connection<Substance>> {
    const page = pageOf(first, after);
    const [rows, count] = await this.substances.search(search, page);
    return toConnection(rows, count, page);
  }

  @Query(() => Substance, { nullable: true, description: 'One substance; null when there is none.' })
  @AnyoneMay()
  substance(@Args('ref', { type: () => SubstanceRef }) ref: SubstanceRef): Promise<Substance | null> {
    return this.substances.find(ref);
  }

  @Mutation(() => SubstancePayload, { description: 'Researchers and editors.' })
  @RolesMay('RESEARCHER', 'EDITOR')
  async createSubstance(
    @Args('input', { type: () => SubstanceInput }) input: SubstanceInput,
    @CurrentViewer() viewer: Viewer,
  ): Promise<SubstancePayload> {
    const outcome = await this.substances.create(input, viewer);
    return outcome.ok ? { substance: outcome.value, problems: [] } : { substance: null, problems: outcome.problems };
  }

  @Mutation(() => SubstancePayload, { description: 'Researchers and editors.' })
  @RolesMay('RESEARCHER', 'EDITOR')
  async updateSubstance(
    @Args('input', { type: () => UpdateSubstanceInput }) input: UpdateSubstanceInput,
  ): Promise<SubstancePayload> {
    const outcome = await this.substances.update(input);
    return outcome.ok ? { substance: outcome.value, problems: [] } : { substance: null, problems: outcome.problems };
  }
}

@Resolver(() => SubstanceConstant)
export class SubstanceConstantsResolver {
  @ResolveField(() => String, { description: 'What it is, in words.' })
  label(@Parent() constant: SubstanceConstant): string {
    return CONSTANT_KINDS[constant.kind].label;
  }

  @ResolveField(() => String, { description: 'Its usual symbol.' })
  symbol(@Parent() constant: SubstanceConstant): string {
    return CONSTANT_KINDS[constant.kind].symbol;
  }
}
