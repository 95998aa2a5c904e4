import { Injectable, type OnModuleInit } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { type DataSource, type EntityManager } from 'typeorm';
import { jobQueue } from '../jobs/job-queue.js';
import { JobsService } from '../jobs/jobs.service.js';
import { type DoiMetadata, DoiRegistrar } from './doi-registrar.js';

export interface DoiRegistration {
  readonly versionId: string;
  readonly doi: string;
  readonly metadata: DoiMetadata;
}

/** Retried for about two days. */
const REGISTER = jobQueue<DoiRegistration>('doi.register', {
  expireInSeconds: 30,
  retryLimit: 12,
  retryDelaySeconds: 30,
});

/** Registers the DOIs of released versions, after the release has committed. */
@Injectable()
export class RegistrarService implements OnModuleInit {
  constructor(
    private readonly registrar: DoiRegistrar,
    private readonly jobs: JobsService,
    @InjectDataSource() private readonly dataSource: DataSource,
  ) {}

  async onModuleInit(): Promise<void> {
    await this.jobs.work(REGISTER, ({ data }) => this.register(data));
  }

  /** Has the DOI registered once the caller's transaction commits. */
  async enqueue(manager: EntityManager, registration: DoiRegistration): Promise<void> {
    await this.jobs.send(manager, REGISTER, registration);
  }

  private async register({ versionId, doi, metadata }: DoiRegistration): Promise<void> {
    await this.registrar.register(doi, metadata);
    await this.dataSource.query(
      'UPDATE data_sheet_versions SET doi_registered_at = now() WHERE id = $1 AND doi_registered_at IS NULL',
      [versionId],
    );
  }
}
