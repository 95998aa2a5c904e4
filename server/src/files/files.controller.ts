import { type Readable } from 'node:stream';
import { type MultipartFile } from '@fastify/multipart';
import { Controller, Get, HttpException, Param, Post, Req, Res } from '@nestjs/common';
import { type FastifyReply, type FastifyRequest } from 'fastify';
import { RolesMay, SignedInMay } from '../common/access.decorators.js';
import { ApiError } from '../common/api-error.js';
import { detailsOf } from '../common/problem-details.filter.js';
import { CurrentViewer, type Viewer } from '../common/viewer.js';
import { attachment } from './file-rules.js';
import { FilesService } from './files.service.js';

const MOST_BYTES = 20 * 1024 * 1024;
/** What the boundaries and headers of a multipart body may add to its file. */
const MULTIPART_BYTES = 64 * 1024;

interface UploadedFile {
  id: string;
  name: string;
  size: number;
  sha256: string;
}

@Controller('api/files')
export class FilesController {
  constructor(private readonly files: FilesService) {}

  @Post()
  @RolesMay('RESEARCHER', 'EDITOR')
  async upload(
    @Req() request: FastifyRequest,
    @Res({ passthrough: true }) reply: FastifyReply,
    @CurrentViewer() viewer: Viewer,
  ): Promise<UploadedFile> {
    // What says that it is too large is not read at all.
    if (Number(request.headers['content-length']) > MOST_BYTES + MULTIPART_BYTES) throw refuseTheRest(request, reply);
    const part = await filePart(request);
    const bytes = await readPart(part);
    if (bytes === null) throw refuseTheRest(request, reply);
    const { id, name, sha256, sizeBytes } = await this.files.keep(part.filename, bytes, viewer);
    return { id, name, size: Number(sizeBytes), sha256 };
  }

  /** The original, byte for byte. */
  @Get(':id')
  @SignedInMay()
  async download(
    @Param('id') id: string,
    @Res({ passthrough: true }) reply: FastifyReply,
    @CurrentViewer() viewer: Viewer,
  ): Promise<Readable> {
    const file = await this.files.find(id, viewer);
    const stream = await this.files.open(file);
    reply
      .header('content-type', file.mediaType)
      .header('content-length', file.sizeBytes)
      .header('content-disposition', attachment(file.name))
      .header('cache-control', 'private, no-store');
    return stream;
  }
}

async function filePart(request: FastifyRequest): Promise<MultipartFile> {
  const part = request.isMultipart() ? await request.file() : undefined;
  if (part?.fieldname === 'file') return part;
  part?.file.resume();
  throw new ApiError('BAD_USER_INPUT', 'Send the file as the multipart field `file`.');
}

/** The bytes of the file; null when they go beyond the limit, where reading ends. */
async function readPart(part: MultipartFile): Promise<Buffer | null> {
  const chunks: Buffer[] = [];
  for await (const chunk of part.file as AsyncIterable<Buffer>) chunks.push(chunk);
  return part.file.truncated ? null : Buffer.concat(chunks);
}

const tooLarge = (): HttpException =>
  new HttpException(
    { message: 'The file is larger than 20 MB. Bring it in as several tables.', code: 'TOO_LARGE' },
    413,
  );

/** How long a sender has to notice the answer before the connection ends under what it still sends. */
const NOTICE_MS = 2_000;

/**
 * Answers 413 while the request is still being sent, and reads no more of it. Ending the connection at once would break
 * the sender's writing before it has read the answer.
 *
 * @returns the refusal, for the caller to throw; it finds the request answered
 */
function refuseTheRest(request: FastifyRequest, reply: FastifyReply): HttpException {
  const refusal = tooLarge();
  request.raw.unpipe();
  request.raw.pause();
  reply.hijack();
  const body = JSON.stringify(detailsOf(refusal));
  for (const [name, value] of Object.entries(reply.getHeaders())) {
    if (value !== undefined) reply.raw.setHeader(name, value);
  }
  reply.raw.writeHead(413, {
    'content-type': 'application/problem+json; charset=utf-8',
    'content-length': Buffer.byteLength(body),
    connection: 'close',
  });
  reply.raw.write(body);
  const end = setTimeout(() => reply.raw.end(), NOTICE_MS);
  request.raw.once('close', () => clearTimeout(end));
  return refusal;
}
