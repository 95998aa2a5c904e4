import { Module } from '@nestjs/common';
import { AuthModule } from '../auth/auth.module.js';
import { DataSheetsModule } from '../data-sheets/data-sheets.module.js';
import { FitsModule } from '../fits/fits.module.js';
import { JobsModule } from '../jobs/jobs.module.js';
import { MailModule } from '../mail/mail.module.js';
import { PeopleModule } from '../people/people.module.js';
import { RegistrarModule } from '../registrar/registrar.module.js';
import { StorageModule } from '../storage/storage.module.js';
import { SubscriptionsModule } from '../subscriptions/subscriptions.module.js';
import { ReleaseArchiveService } from './release-archive.service.js';
import { ReleaseNoticesService } from './release-notices.service.js';
import { ReleasesResolver } from './releases.resolver.js';
import { ReleasesService } from './releases.service.js';
import { SheetFactsService } from './sheet-facts.service.js';
import { VersionContentService } from './version-content.service.js';

@Module({
  imports: [
    AuthModule,
    DataSheetsModule,
    FitsModule,
    JobsModule,
    MailModule,
    PeopleModule,
    RegistrarModule,
    StorageModule,
    SubscriptionsModule,
  ],
  providers: [
    ReleaseArchiveService,
    ReleaseNoticesService,
    ReleasesResolver,
    ReleasesService,
    SheetFactsService,
    VersionContentService,
  ],
  exports: [ReleaseArchiveService, ReleasesService, SheetFactsService, VersionContentService],
})
export class ReleasesModule {}
