import { type DynamicModule, Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { GraphQLModule } from './common/graphql/graphql.module.js';
import { ConfigModule } from './config/config.module.js';
import { type Env } from './config/env.js';
import { dataSourceOptions } from './database/data-source.js';
import { HealthModule } from './health/health.module.js';

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
        HealthModule,
      ],
    };
  }
}
