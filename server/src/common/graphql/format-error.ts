import { unwrapResolverError } from '@apollo/server/errors';
import { HttpException, Logger } from '@nestjs/common';
import { type GraphQLFormattedError } from 'graphql';
import { ApiError, type ApiErrorCode } from '../api-error.js';

const log = new Logger('GraphQL');

const CODE_OF_STATUS: Record<number, ApiErrorCode> = {
  400: 'BAD_USER_INPUT',
  401: 'UNAUTHENTICATED',
  403: 'FORBIDDEN',
  404: 'NOT_FOUND',
  409: 'CONFLICT',
  429: 'RATE_LIMITED',
};

/** Codes that GraphQL and Apollo give themselves and that may pass. */
const PASSING_CODES = new Set([
  'QUERY_TOO_COSTLY',
  'GRAPHQL_PARSE_FAILED',
  'GRAPHQL_VALIDATION_FAILED',
  'BAD_USER_INPUT',
  'BAD_REQUEST',
]);

/** Query-limit messages of the guard rules; they carry no code of their own. */
const TOO_COSTLY = /(Query depth|Aliases|Directives) limit of \d+ exceeded|Document contains more tha[nt] \d+ tokens/;

function answer(formatted: GraphQLFormattedError, code: string, message: string): GraphQLFormattedError {
  const { locations, path } = formatted;
  return { message, ...(locations && { locations }), ...(path && { path }), extensions: { code } };
}

/** One shape for every GraphQL error. The message of an unexpected one is logged and never leaves the server. */
export function formatError(formatted: GraphQLFormattedError, error: unknown): GraphQLFormattedError {
  const original = unwrapResolverError(error);
  if (original instanceof ApiError) return answer(formatted, original.code, original.message);
  if (original instanceof HttpException) {
    const code = CODE_OF_STATUS[original.getStatus()];
    if (code) return answer(formatted, code, original.message);
  }
  if (TOO_COSTLY.test(formatted.message)) return answer(formatted, 'QUERY_TOO_COSTLY', formatted.message);
  const code = formatted.extensions?.['code'];
  if (typeof code === 'string' && PASSING_CODES.has(code)) return answer(formatted, code, formatted.message);
  log.error(original instanceof Error ? (original.stack ?? original.message) : formatted.message);
  return answer(formatted, 'INTERNAL', 'Something went wrong on the server. It has been noted.');
}
