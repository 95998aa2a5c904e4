import { createHash, randomBytes } from 'node:crypto';

const TOKEN_BYTES = 32;

/** A new secret of 256 random bits, in characters that survive a URL. */
export function newSecretToken(): string {
  return randomBytes(TOKEN_BYTES).toString('base64url');
}

/**
 * What is stored in place of a secret token. A plain SHA-256 serves, because the token has 256 random bits and so
 * cannot be guessed; passwords, which can, are hashed with argon2id instead.
 */
export function hashSecretToken(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}
