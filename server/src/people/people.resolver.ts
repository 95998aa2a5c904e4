import { Context, Parent, Query, ResolveField, Resolver, registerEnumType } from '@nestjs/graphql';
import { AnyoneMay, RolesMay } from '../common/access.decorators.js';
import { loaderFor } from '../common/graphql/loader-for.js';
import { CurrentViewer, hasRole, type Viewer } from '../common/viewer.js';
import { type Account, type AccountStatus, ACCOUNT_STATUSES, PeopleService } from './people.service.js';
import { Person } from './person.entity.js';

const AccountStatusEnum = Object.fromEntries(ACCOUNT_STATUSES.map((status) => [status, status]));
registerEnumType(AccountStatusEnum, { name: 'AccountStatus' });

@Resolver(() => Person)
export class PeopleResolver {
  constructor(private readonly peopleService: PeopleService) {}

  @Query(() => Person, { nullable: true, description: 'Who asks; null for a visitor.' })
  @AnyoneMay()
  me(@CurrentViewer() viewer: Viewer | null): Promise<Person | null> {
    return viewer ? this.peopleService.find(viewer.id) : Promise.resolve(null);
  }

  @Query(() => [Person], { description: 'Administrators. By name.' })
  @RolesMay('ADMINISTRATOR')
  people(): Promise<Person[]> {
    return this.peopleService.all();
  }

  @ResolveField(() => String, { nullable: true, description: 'To administrators and to the person; null to others.' })
  async email(
    @Parent() person: Person,
    @CurrentViewer() viewer: Viewer | null,
    @Context() context: object,
  ): Promise<string | null> {
    const mine = viewer?.id === person.id;
    return mine || hasRole(viewer, 'ADMINISTRATOR') ? (await this.account(person, context)).email : null;
  }

  @ResolveField(() => AccountStatusEnum, { nullable: true, description: 'To administrators; null to others.' })
  async accountStatus(
    @Parent() person: Person,
    @CurrentViewer() viewer: Viewer | null,
    @Context() context: object,
  ): Promise<AccountStatus | null> {
    return hasRole(viewer, 'ADMINISTRATOR') ? (await this.account(person, context)).status : null;
  }

  @ResolveField(() => Date, {
    nullable: true,
    description: 'When a session of the person was last begun or continued. To administrators; null to others.',
  })
  async lastSeenAt(
    @Parent() person: Person,
    @CurrentViewer() viewer: Viewer | null,
    @Context() context: object,
  ): Promise<Date | null> {
    return hasRole(viewer, 'ADMINISTRATOR') ? (await this.account(person, context)).lastSeenAt : null;
  }

  private account(person: Person, context: object): Promise<Account> {
    return loaderFor(context, this.peopleService.accountsByIds).load(person.id);
  }
}
