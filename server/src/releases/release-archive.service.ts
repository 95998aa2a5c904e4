import { Injectable } from '@nestjs/common';
import { DataSource } from 'typeorm';
import { renderSheetPdf } from '../sheet-documents/pdf/render-sheet-pdf.js';
import { readSnapshot } from '../sheet-documents/snapshot.js';
import { StorageService } from '../storage/storage.service.js';
import { Release } from './release.entity.js';
import { readAll } from './read-all.js';

const PDF = 'application/pdf';
const keyOf = (contentHash: string) => `releases/${contentHash}.pdf`;

/** The PDF of each release as it was on the day of its release, kept beside the record. */
@Injectable()
export class ReleaseArchiveService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly storage: StorageService,
  ) {}

  /** Renders and stores the PDF of a release; does nothing when it is there. */
  async archivePdf(contentHash: string): Promise<void> {
    if (await this.storage.exists(keyOf(contentHash))) return;
    await this.storage.put(keyOf(contentHash), await this.render(contentHash), PDF);
  }

  /** The archived bytes; archived now when the job has not come to it yet. */
  async pdfOf(contentHash: string): Promise<Buffer> {
    await this.archivePdf(contentHash);
    const stored = await this.storage.get(keyOf(contentHash));
    if (!stored) throw new Error(`the PDF of release ${contentHash} is not in the file storage`);
    return readAll(stored);
  }

  private async render(contentHash: string): Promise<Buffer> {
    const release = await this.dataSource.getRepository(Release).findOneByOrFail({ contentHash });
    const { content } = readSnapshot(release.snapshot);
    // The hash cannot stand in the text it is made from; the printed sheet bears it all the same.
    return renderSheetPdf({ ...content, standing: { ...content.standing, contentHash } });
  }
}
