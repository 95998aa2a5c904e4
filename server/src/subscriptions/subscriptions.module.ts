import { Module } from '@nestjs/common';
import { SubscriptionsResolver } from './subscriptions.resolver.js';
import { SubscriptionsService } from './subscriptions.service.js';

@Module({ providers: [SubscriptionsService, SubscriptionsResolver], exports: [SubscriptionsService] })
export class SubscriptionsModule {}
