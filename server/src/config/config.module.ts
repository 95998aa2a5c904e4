import { Global, Module, type DynamicModule } from '@nestjs/common';
import { type Env } from './env.js';

/** Injection token of the checked settings (`Env`). */
export const ENV = Symbol('ENV');

@Global()
@Module({})
export class ConfigModule {
  static with(env: Env): DynamicModule {
    return { module: ConfigModule, providers: [{ provide: ENV, useValue: env }], exports: [ENV] };
  }
}
