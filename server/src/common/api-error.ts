/** What a caller cannot mend, by its code in the public contract. */
export const API_ERROR_CODES = [
  'UNAUTHENTICATED',
  'FORBIDDEN',
  'NOT_FOUND',
  'CONFLICT',
  'BAD_USER_INPUT',
  'OUT_OF_RANGE',
  'NOT_AVAILABLE',
  'RATE_LIMITED',
  'QUERY_TOO_COSTLY',
  'INTERNAL',
] as const;
export type ApiErrorCode = (typeof API_ERROR_CODES)[number];

/** Thrown anywhere in the server for what the caller cannot mend; the edges turn it into GraphQL errors or problem+json. */
export class ApiError extends Error {
  constructor(
    readonly code: ApiErrorCode,
    message: string,
  ) {
    super(message);
    this.name = 'ApiError';
  }
}
