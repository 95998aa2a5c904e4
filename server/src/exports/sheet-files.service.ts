import { Injectable } from '@nestjs/common';
import { LRUCache } from 'lru-cache';
import { ReleaseArchiveService } from '../releases/release-archive.service.js';
import { renderSheetPdf, type Paper } from '../sheet-documents/pdf/render-sheet-pdf.js';
import { sheetCsv } from '../sheet-documents/sheet-csv.js';
import { releasedTag } from './caching-rules.js';
import type { ReadableVersion } from './readable-version.js';
import type { FileFormat } from './representation-rules.js';

const PDF_BYTES_REMEMBERED = 32 * 1024 * 1024;

/** The files a version is given out as. */
@Injectable()
export class SheetFilesService {
  /** PDFs of released versions by their validator */
  private readonly pdfs = new LRUCache<string, Buffer>({
    maxSize: PDF_BYTES_REMEMBERED,
    sizeCalculation: (pdf) => pdf.length,
  });

  constructor(private readonly archive: ReleaseArchiveService) {}

  async write(version: ReadableVersion, format: FileFormat, paper: Paper): Promise<string | Buffer> {
    switch (format) {
      case 'JSON':
        return sheetJson(version);
      case 'CSV':
        return sheetCsv(version.content);
      case 'PDF':
        return this.pdf(version, paper);
    }
  }

  private async pdf(version: ReadableVersion, paper: Paper): Promise<Buffer> {
    if (!version.isReleased) return renderSheetPdf(version.content, paper);
    const tag = releasedTag(version.standing, version.versions, 'PDF', paper);
    const known = this.pdfs.get(tag);
    if (known !== undefined) return known;
    const pdf = await this.releasedPdf(version, paper);
    this.pdfs.set(tag, pdf);
    return pdf;
  }

  /** Of the current version the archived bytes; of any other what says in the document how it stands. */
  private releasedPdf({ content, standing }: ReadableVersion, paper: Paper): Promise<Buffer> {
    const { status, contentHash } = standing;
    if (status === 'RELEASED' && paper === 'A4' && contentHash !== null) return this.archive.pdfOf(contentHash);
    return renderSheetPdf(content, paper);
  }
}

/** How the version stands comes first; then its correlation with all digits, ready to be evaluated, and all that the sheet says. */
function sheetJson({ code, number, content, correlation }: ReadableVersion): string {
  const { standing } = content;
  const release = standing.contentHash === null ? null : `/releases/${standing.contentHash}.json`;
  return JSON.stringify({ sheet: code, number, standing, release, correlation, content });
}
