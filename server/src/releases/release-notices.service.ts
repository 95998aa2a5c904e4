import { Injectable, type OnModuleInit } from '@nestjs/common';
import { EntityManager } from 'typeorm';
import { DataSheet } from '../data-sheets/data-sheet.entity.js';
import { DataSheetVersion } from '../data-sheets/data-sheet-version.entity.js';
import { formatNumber } from '../data-sheets/version-rules.js';
import { jobQueue } from '../jobs/job-queue.js';
import { JobsService } from '../jobs/jobs.service.js';
import { MailService } from '../mail/mail.service.js';
import { PublicAddressService } from '../mail/public-address.service.js';
import { RegistrarService } from '../registrar/registrar.service.js';
import { readSnapshot } from '../sheet-documents/snapshot.js';
import { SubscriptionsService } from '../subscriptions/subscriptions.service.js';
import { ReleaseArchiveService } from './release-archive.service.js';
import { Release } from './release.entity.js';

const ARCHIVE = jobQueue<{ contentHash: string }>('release.archive', {
  expireInSeconds: 120,
  retryLimit: 8,
  retryDelaySeconds: 30,
});

/** What follows a release or withdrawal: letters, DOI and the archived PDF, as jobs of the same transaction. */
@Injectable()
export class ReleaseNoticesService implements OnModuleInit {
  constructor(
    private readonly addresses: PublicAddressService,
    private readonly jobs: JobsService,
    private readonly mail: MailService,
    private readonly registrar: RegistrarService,
    private readonly subscriptions: SubscriptionsService,
    private readonly archive: ReleaseArchiveService,
  ) {}

  async onModuleInit(): Promise<void> {
    await this.jobs.work(ARCHIVE, ({ data }) => this.archive.archivePdf(data.contentHash));
  }

  async released(
    tx: EntityManager,
    what: { sheet: DataSheet; version: DataSheetVersion; release: Release; earlier: DataSheetVersion | null },
  ): Promise<void> {
    const { sheet, version, release, earlier } = what;
    const number = formatNumber(version);
    const { content, people } = readSnapshot(release.snapshot);
    const link = this.addressOf(sheet, number);
    await this.jobs.send(tx, ARCHIVE, { contentHash: release.contentHash });
    await this.registrar.enqueue(tx, {
      versionId: version.id,
      doi: release.doi,
      metadata: {
        url: link,
        title: `${content.title}: diffusivity data sheet ${sheet.code}, version ${number}`,
        creators: [people.preparedBy],
        publisher: 'Diffolio',
        publicationYear: release.releasedAt.getUTCFullYear(),
        version: number,
        supersedes: earlier && ((await tx.findOneBy(Release, { versionId: earlier.id }))?.doi ?? null),
      },
    });
    for (const { email, personId } of await this.subscriptions.subscribersOf(tx, sheet.id)) {
      await this.mail.enqueue(tx, {
        to: email,
        template: 'releaseNotice',
        values: {
          sheet: sheet.code,
          pair: content.title,
          number,
          earlier: earlier ? formatNumber(earlier) : '',
          changes: version.changeNote ?? '',
          link,
        },
        dedupeKey: `release:${version.id}:${personId}`,
      });
    }
  }

  async withdrawn(
    tx: EntityManager,
    { sheet, version }: { sheet: DataSheet; version: DataSheetVersion },
  ): Promise<void> {
    const release = await tx.findOneByOrFail(Release, { versionId: version.id });
    const number = formatNumber(version);
    for (const { email, personId } of await this.subscriptions.subscribersOf(tx, sheet.id)) {
      await this.mail.enqueue(tx, {
        to: email,
        template: 'withdrawalNotice',
        values: {
          sheet: sheet.code,
          pair: readSnapshot(release.snapshot).content.title,
          number,
          reason: version.withdrawalReason ?? '',
          link: this.addressOf(sheet, number),
        },
        dedupeKey: `withdrawal:${version.id}:${personId}`,
      });
    }
  }

  private addressOf(sheet: DataSheet, number: string): string {
    return this.addresses.linkTo(`/sheets/${sheet.code}/${number}`);
  }
}
