import { Injectable } from '@nestjs/common';
import { DataSource } from 'typeorm';
import { DataSheetVersion } from '../data-sheets/data-sheet-version.entity.js';
import { buildSheetContent } from '../sheet-documents/sheet-content.js';
import { type SheetContent } from '../sheet-documents/sheet-content.types.js';
import { withStanding } from '../sheet-documents/sheet-provenance.js';
import { readSnapshot } from '../sheet-documents/snapshot.js';
import { Release } from './release.entity.js';
import { SheetFactsService } from './sheet-facts.service.js';

/** What a version says: of a released one what was frozen, with the way it stands today; of an open one what it would say. */
@Injectable()
export class VersionContentService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly facts: SheetFactsService,
  ) {}

  async contentOf(version: DataSheetVersion): Promise<SheetContent> {
    const release = await this.dataSource.getRepository(Release).findOneBy({ versionId: version.id });
    if (!release) return buildSheetContent(await this.facts.factsOf(version));
    const standing = await this.facts.standingOf(version, release);
    const versions = await this.facts.versionsOf(this.dataSource.manager, version);
    return withStanding(readSnapshot(release.snapshot).content, standing, versions);
  }
}
