import path from 'node:path';
import { Module } from '@nestjs/common';
import { ENV } from '../config/config.module.js';
import { type Env } from '../config/env.js';
import { JobsModule } from '../jobs/jobs.module.js';
import { DoiRegistrar } from './doi-registrar.js';
import { HttpDoiRegistrar } from './http-doi-registrar.js';
import { LocalDoiRegistrar } from './local-doi-registrar.js';
import { RegistrarService } from './registrar.service.js';

const registrar = {
  provide: DoiRegistrar,
  inject: [ENV],
  useFactory: (env: Env): DoiRegistrar =>
    env.DOI_REGISTRAR_URL
      ? new HttpDoiRegistrar(env.DOI_REGISTRAR_URL)
      : new LocalDoiRegistrar(path.join(env.DIFFOLIO_DATA_DIR, 'registrations')),
};

@Module({ imports: [JobsModule], providers: [registrar, RegistrarService], exports: [RegistrarService] })
export class RegistrarModule {}
