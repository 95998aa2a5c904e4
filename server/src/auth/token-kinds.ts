/** Who signs; checked on every token. */
export const ISSUER = 'diffolio';

/** The only algorithm that is signed with or accepted. */
export const ALGORITHM = 'HS256';

/** `typ` and audience keep one kind of token from serving as another (RFC 8725, 3.11 and 3.12; `at+jwt` is RFC 9068). */
export const ACCESS_TOKEN = { typ: 'at+jwt', audience: 'diffolio-api', lifeSeconds: 15 * 60 } as const;
export const DEVICE_TOKEN = { typ: 'device+jwt', audience: 'diffolio-device', lifeSeconds: 365 * 24 * 3600 } as const;
