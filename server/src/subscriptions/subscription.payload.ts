import { Field, ObjectType } from '@nestjs/graphql';
import { Problem } from '../common/problem.js';
import { SheetSubscription } from './sheet-subscription.js';

@ObjectType()
export class SubscriptionPayload {
  @Field(() => SheetSubscription, { nullable: true, description: 'The subscription made or ended.' })
  readonly subscription: SheetSubscription | null;
  @Field(() => [Problem])
  readonly problems: Problem[];
}
