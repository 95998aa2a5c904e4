import { Args, ID, Mutation, Query, Resolver } from '@nestjs/graphql';
import { SignedInMay } from '../common/access.decorators.js';
import { CurrentViewer, type Viewer } from '../common/viewer.js';
import { SheetSubscription } from './sheet-subscription.js';
import { SubscriptionPayload } from './subscription.payload.js';
import { SubscriptionsService } from './subscriptions.service.js';

@Resolver()
export class SubscriptionsResolver {
  constructor(private readonly subscriptionsService: SubscriptionsService) {}

  @Query(() => [SheetSubscription], { description: "The caller's own." })
  @SignedInMay()
  subscriptions(@CurrentViewer() viewer: Viewer): Promise<SheetSubscription[]> {
    return this.subscriptionsService.ofPerson(viewer.id);
  }

  @Mutation(() => SubscriptionPayload, {
    description: 'Tells the caller by e-mail when a version is released or withdrawn.',
  })
  @SignedInMay()
  async subscribeToSheet(
    @Args('sheetId', { type: () => ID }) sheetId: string,
    @CurrentViewer() viewer: Viewer,
  ): Promise<SubscriptionPayload> {
    return { subscription: await this.subscriptionsService.subscribe(viewer.id, sheetId), problems: [] };
  }

  @Mutation(() => SubscriptionPayload)
  @SignedInMay()
  async unsubscribeFromSheet(
    @Args('sheetId', { type: () => ID }) sheetId: string,
    @CurrentViewer() viewer: Viewer,
  ): Promise<SubscriptionPayload> {
    const outcome = await this.subscriptionsService.unsubscribe(viewer.id, sheetId);
    return outcome.ok
      ? { subscription: outcome.value, problems: [] }
      : { subscription: null, problems: outcome.problems };
  }
}
