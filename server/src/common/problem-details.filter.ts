import { type ArgumentsHost, Catch, type ExceptionFilter, HttpException, Logger } from '@nestjs/common';
import { type FastifyReply } from 'fastify';
import { ApiError, type ApiErrorCode } from './api-error.js';

const STATUS_OF: Record<ApiErrorCode, number> = {
  UNAUTHENTICATED: 401,
  FORBIDDEN: 403,
  NOT_FOUND: 404,
  CONFLICT: 409,
  BAD_USER_INPUT: 400,
  OUT_OF_RANGE: 422,
  NOT_AVAILABLE: 422,
  RATE_LIMITED: 429,
  QUERY_TOO_COSTLY: 400,
  INTERNAL: 500,
};

/** RFC 9457. `code` and whatever else an error carries are extension members. */
export interface ProblemDetails {
  type: 'about:blank';
  title: string;
  status: number;
  detail?: string;
  [member: string]: unknown;
}

/** What an error says to the outside; an unexpected one says nothing of itself. */
export function detailsOf(error: unknown): ProblemDetails {
  if (error instanceof ApiError) {
    return {
      type: 'about:blank',
      title: error.code,
      status: STATUS_OF[error.code],
      detail: error.message,
      code: error.code,
    };
  }
  if (error instanceof HttpException) {
    const body = error.getResponse();
    const members = typeof body === 'object' ? (body as Record<string, unknown>) : {};
    const { message: _message, statusCode: _status, error: _title, ...extensions } = members;
    return { ...extensions, type: 'about:blank', title: error.name, status: error.getStatus(), detail: error.message };
  }
  const status = (error as { statusCode?: unknown }).statusCode;
  if (typeof status === 'number' && status >= 400 && status < 500) {
    return { type: 'about:blank', title: 'Request refused', status, detail: (error as Error).message };
  }
  return {
    type: 'about:blank',
    title: 'INTERNAL',
    status: 500,
    detail: 'Something went wrong on the server. It has been noted.',
  };
}

/** Every error outside GraphQL as `application/problem+json`; GraphQL formats its own. */
@Catch()
export class ProblemDetailsFilter implements ExceptionFilter {
  private readonly log = new Logger('HTTP');

  catch(error: unknown, host: ArgumentsHost): void {
    if (host.getType<'http' | 'graphql'>() !== 'http') throw error;
    const details = detailsOf(error);
    if (details.status >= 500) this.log.error(error instanceof Error ? (error.stack ?? error.message) : String(error));
    const reply = host.switchToHttp().getResponse<FastifyReply>();
    if (reply.sent) return;
    void reply
      .status(details.status)
      .header('content-type', 'application/problem+json; charset=utf-8')
      .send(JSON.stringify(details));
  }
}
