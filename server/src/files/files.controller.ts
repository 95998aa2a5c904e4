import { type Readable } from 'node:stream';
import { type MultipartFile } from '@fastify/multipart';
import { Controller, Get, HttpException, Param, Post, Req, Res } from '@nestjs/common';
import { type FastifyReply, type FastifyRequest } from 'fastify';
import { RolesMay, SignedInMay } from '../common/access.decorators.js';
import { ApiError } from '../common/api-error.js';
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
    // What says that it is too large is not read at all; the connection ends with the answer.
    if (Number(request.headers['content-length']) > MOST_BYTES + MULTIPART_BYTES) {
      reply.header('connection', 'close');
      throw tooLarge();
    }
    const part = await filePart(request);
    const bytes = await readPart(part, reply);
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

/** The bytes of the file; reading ends where the limit does. */
async function readPart(part: MultipartFile, reply: FastifyReply): Promise<Buffer> {
  const chunks: Buffer[] = [];
  for await (const chunk of part.file as AsyncIterable<Buffer>) chunks.push(chunk);
  if (!part.file.truncated) return Buffer.concat(chunks);
  reply.header('connection', 'close');
  throw tooLarge();
}

const tooLarge = (): HttpException =>
  new HttpException(
    { message: 'The file is larger than 20 MB. Bring it in as several tables.', code: 'TOO_LARGE' },
    413,
  );
