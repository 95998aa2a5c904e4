import { createHash } from 'node:crypto';
import { createRequire } from 'node:module';

// The package exports the function itself, while its types describe an ES module with a default export.
const canonicalize = createRequire(import.meta.url)('canonicalize') as (value: unknown) => string | undefined;

/**
 * Canonical JSON (RFC 8785).
 *
 * @throws {Error} when a number is not finite
 * @throws {TypeError} for what JSON has no text for
 */
export function canonicalJson(value: unknown): string {
  const text = canonicalize(value);
  if (text === undefined) throw new TypeError('there is no JSON text for this value');
  return text;
}

/** Lower-case hex SHA-256 of the UTF-8 bytes of a text. */
export const sha256Of = (text: string): string => createHash('sha256').update(text, 'utf8').digest('hex');
