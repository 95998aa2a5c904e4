import { Controller, Get, Param, Res } from '@nestjs/common';
import type { FastifyReply } from 'fastify';
import { AnyoneMay } from '../common/access.decorators.js';
import { ApiError } from '../common/api-error.js';
import { ReleaseArchiveService } from '../releases/release-archive.service.js';
import { ReleasesService } from '../releases/releases.service.js';
import { ARCHIVED_CACHING, archivedTag } from './caching-rules.js';

const ADDRESS = /^([0-9a-f]{64})\.(json|pdf)$/;

/** The archived bytes of releases, by their hash, for ever. */
@Controller('releases')
export class ReleaseFilesController {
  constructor(
    private readonly releases: ReleasesService,
    private readonly archive: ReleaseArchiveService,
  ) {}

  @Get(':address')
  @AnyoneMay()
  async file(@Param('address') address: string, @Res() reply: FastifyReply): Promise<void> {
    const [, contentHash, extension] = ADDRESS.exec(address) ?? [];
    const release = contentHash === undefined ? null : await this.releases.findByHash(contentHash);
    if (release === null) throw new ApiError('NOT_FOUND', 'There is no such release.');
    const isPdf = extension === 'pdf';
    const body = isPdf ? await this.archive.pdfOf(release.contentHash) : release.snapshot;
    await reply
      .header('content-type', isPdf ? 'application/pdf' : 'application/json; charset=utf-8')
      .header('cache-control', ARCHIVED_CACHING)
      .header('etag', archivedTag(release.contentHash, isPdf ? 'PDF' : 'JSON'))
      .send(body);
  }
}
