import { type DynamicModule, Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { ApiKeysModule } from './api-keys/api-keys.module.js';
import { AuthModule } from './auth/auth.module.js';
import { BringInModule } from './bring-in/bring-in.module.js';
import { GraphQLModule } from './common/graphql/graphql.module.js';
import { ConfigModule } from './config/config.module.js';
import { type Env } from './config/env.js';
import { dataSourceOptions } from './database/data-source.js';
import { DataSheetsModule } from './data-sheets/data-sheets.module.js';
import { ExportsModule } from './exports/exports.module.js';
import { FilesModule } from './files/files.module.js';
import { FitsModule } from './fits/fits.module.js';
import { HealthModule } from './health/health.module.js';
import { HomeModule } from './home/home.module.js';
import { JobsModule } from './jobs/jobs.module.js';
import { MailModule } from './mail/mail.module.js';
import { NodesModule } from './nodes/nodes.module.js';
import { PairsModule } from './pairs/pairs.module.js';
import { PeopleModule } from './people/people.module.js';
import { ReleasesModule } from './releases/releases.module.js';
import { ReviewsModule } from './reviews/reviews.module.js';
import { SeriesModule } from './series/series.module.js';
import { SubscriptionsModule } from './subscriptions/subscriptions.module.js';
import { SubstancesModule } from './substances/substances.module.js';

/** Composes the server from its modules; nothing else. */
@Module({})
export class AppModule {
  static with(env: Env): DynamicModule {
    return {
      module: AppModule,
      imports: [
        ConfigModule.with(env),
        TypeOrmModule.forRoot(dataSourceOptions(env.DATABASE_URL)),
        GraphQLModule,
        JobsModule,
        MailModule,
        PeopleModule,
        AuthModule,
        ApiKeysModule,
        SubstancesModule,
        PairsModule,
        FilesModule,
        SeriesModule,
        BringInModule,
        FitsModule,
        DataSheetsModule,
        ReviewsModule,
        ReleasesModule,
        ExportsModule,
        SubscriptionsModule,
        NodesModule,
        HomeModule,
        HealthModule,
      ],
    };
  }
}
