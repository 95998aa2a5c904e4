import { Controller, Get, Param, Query, Req, Res } from '@nestjs/common';
import type { FastifyReply, FastifyRequest } from 'fastify';
import { AnyoneMay } from '../common/access.decorators.js';
import { ApiError } from '../common/api-error.js';
import { CurrentViewer, type Viewer } from '../common/viewer.js';
import { sendPage, wantsPage } from '../pages/pages.js';
import type { Paper } from '../sheet-documents/pdf/render-sheet-pdf.js';
import { RELEASED_CACHING, UNRELEASED_CACHING, releasedTag, standingHeaders } from './caching-rules.js';
import { NotAcceptableProblem } from './not-acceptable.js';
import type { ReadableVersion } from './readable-version.js';
import { ReadableVersionsService } from './readable-versions.service.js';
import { MEDIA_TYPES, negotiate, readVersionAddress, type FileFormat } from './representation-rules.js';
import { SheetFilesService } from './sheet-files.service.js';

const OFFERED = ['JSON', 'PAGE', 'CSV', 'PDF'] as const;

/** Data sheets at their own addresses, as a page or as a file. */
@Controller('sheets')
export class SheetFilesController {
  constructor(
    private readonly versions: ReadableVersionsService,
    private readonly files: SheetFilesService,
  ) {}

  @Get(':code')
  @AnyoneMay()
  async current(
    @Param('code') code: string,
    @Req() request: FastifyRequest,
    @Res() reply: FastifyReply,
  ): Promise<void> {
    try {
      const address = `/sheets/${encodeURIComponent(code)}/${await this.versions.currentNumber(code)}`;
      await reply
        .header('cache-control', 'no-cache')
        .header('link', `<${address}>; rel="latest-version"`)
        .redirect(address, 302);
    } catch (error) {
      // The page says in words why there is no current version; a program gets the problem.
      if (!(error instanceof ApiError) || !wantsPage(request)) throw error;
      await sendPage(reply);
    }
  }

  @Get(':code/:address')
  @AnyoneMay()
  async version(
    @Param('code') code: string,
    @Param('address') address: string,
    @Query('paper') paper: string | undefined,
    @CurrentViewer() viewer: Viewer | null,
    @Req() request: FastifyRequest,
    @Res() reply: FastifyReply,
  ): Promise<void> {
    void reply.header('vary', 'Accept');
    const asked = readVersionAddress(address);
    const format = asked?.format ?? negotiate(request.headers.accept, OFFERED, MEDIA_TYPES);
    if (format === 'PAGE') return sendPage(reply);
    if (asked === null) throw new ApiError('NOT_FOUND', `There is no version ${address} of a data sheet.`);
    if (format === null || format === 'UNKNOWN') throw new NotAcceptableProblem(Object.values(MEDIA_TYPES));
    const version = await this.versions.read(code, asked.number, viewer);
    await this.send(reply, version, format, readPaper(paper));
  }

  private async send(reply: FastifyReply, version: ReadableVersion, format: FileFormat, paper: Paper): Promise<void> {
    const { code, number, standing, versions } = version;
    const name = `${code}-${number}.${format.toLowerCase()}`;
    void reply
      .header('content-type', contentTypeOf(format))
      .header('content-disposition', `${format === 'CSV' ? 'attachment' : 'inline'}; filename="${name}"`)
      .headers(standingHeaders(code, standing, versions));
    if (version.isReleased) {
      void reply
        .header('cache-control', RELEASED_CACHING)
        .header('etag', releasedTag(standing, versions, format, paper));
    } else {
      void reply.header('cache-control', UNRELEASED_CACHING);
    }
    await reply.send(await this.files.write(version, format, paper));
  }
}

const contentTypeOf = (format: FileFormat): string =>
  format === 'PDF' ? MEDIA_TYPES.PDF : `${MEDIA_TYPES[format]}; charset=utf-8`;

/** @throws {ApiError} BAD_USER_INPUT for a paper that is not offered */
export function readPaper(paper: string | undefined): Paper {
  const name = (paper ?? 'A4').toUpperCase();
  if (name !== 'A4' && name !== 'LETTER') throw new ApiError('BAD_USER_INPUT', 'Paper is A4 or Letter.');
  return name;
}
