import { Body, Controller, Headers, HttpCode, Param, Post, Res } from '@nestjs/common';
import type { FastifyReply } from 'fastify';
import { AnyoneMay } from '../common/access.decorators.js';
import { CurrentViewer, type Viewer } from '../common/viewer.js';
import { evaluate } from '../fits/correlation-evaluation.js';
import { standingHeaders } from './caching-rules.js';
import { EVALUATION_MEDIA_TYPES, encodeEvaluation } from './evaluation-encoding.js';
import { readEvaluationRequest } from './evaluation-request.js';
import { NotAcceptableProblem } from './not-acceptable.js';
import { ReadableVersionsService } from './readable-versions.service.js';
import { negotiate } from './representation-rules.js';

const OFFERED = ['JSON', 'CSV', 'NDJSON'] as const;

/** Many values of one version at once, for programs that would rather not speak GraphQL. */
@Controller('sheets')
export class EvaluationController {
  constructor(private readonly versions: ReadableVersionsService) {}

  @Post(':code/:number/evaluate')
  @HttpCode(200)
  @AnyoneMay()
  async evaluate(
    @Param('code') code: string,
    @Param('number') number: string,
    @Body() body: unknown,
    @Headers('accept') accept: string | undefined,
    @CurrentViewer() viewer: Viewer | null,
    @Res() reply: FastifyReply,
  ): Promise<void> {
    const format = negotiate(accept, OFFERED, EVALUATION_MEDIA_TYPES);
    if (format === null) throw new NotAcceptableProblem(Object.values(EVALUATION_MEDIA_TYPES));
    const version = await this.versions.read(code, number, viewer);
    const request = readEvaluationRequest(body);
    const evaluation = evaluate(version.correlation, request);
    const { standing } = version;
    const named = {
      sheet: version.code,
      number: version.number,
      status: standing.status,
      contentHash: standing.contentHash,
    };
    await reply
      .header('content-type', `${EVALUATION_MEDIA_TYPES[format]}; charset=utf-8`)
      .header('cache-control', 'no-store')
      .headers(standingHeaders(version.code, standing, version.versions))
      .send(encodeEvaluation(format, named, request, evaluation));
  }
}
