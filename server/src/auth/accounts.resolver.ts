import { Args, Field, ID, InputType, Mutation, ObjectType, Resolver } from '@nestjs/graphql';
import { RolesMay } from '../common/access.decorators.js';
import { type Outcome, Problem } from '../common/problem.js';
import { CurrentViewer, type RoleName, type Viewer } from '../common/viewer.js';
import { Person, Role } from '../people/person.entity.js';
import { AccountsService } from './accounts.service.js';

@InputType()
export class InvitePersonInput {
  @Field()
  readonly email: string;
  @Field(() => [Role])
  readonly roles: RoleName[];
}

@InputType()
export class UpdatePersonInput {
  @Field(() => ID)
  readonly id: string;
  @Field(() => [Role], { nullable: true, description: 'Unchanged when absent.' })
  readonly roles?: RoleName[] | null;
  @Field(() => Boolean, { nullable: true, description: 'Unchanged when absent. Disabling ends all sessions.' })
  readonly disabled?: boolean | null;
}

@ObjectType()
export class PersonPayload {
  @Field(() => Person, { nullable: true })
  readonly person: Person | null;
  @Field(() => [Problem])
  readonly problems: Problem[];
}

function toPayload(outcome: Outcome<Person>): PersonPayload {
  return outcome.ok ? { person: outcome.value, problems: [] } : { person: null, problems: outcome.problems };
}

@Resolver()
export class AccountsResolver {
  constructor(private readonly accounts: AccountsService) {}

  @Mutation(() => PersonPayload, {
    description: 'Administrators. Mails a link that makes the account; asked again, mails a new one.',
  })
  @RolesMay('ADMINISTRATOR')
  async invitePerson(@Args('input') input: InvitePersonInput, @CurrentViewer() viewer: Viewer): Promise<PersonPayload> {
    return toPayload(await this.accounts.invite(viewer.id, input.email, input.roles));
  }

  @Mutation(() => PersonPayload, { description: 'Administrators. The last administrator stays one.' })
  @RolesMay('ADMINISTRATOR')
  async updatePerson(@Args('input') input: UpdatePersonInput): Promise<PersonPayload> {
    return toPayload(await this.accounts.update(input.id, input));
  }
}
