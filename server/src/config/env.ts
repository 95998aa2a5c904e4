import { z } from 'zod';

const flag = z.enum(['true', 'false']).transform((text) => text === 'true');

/** Every setting of the server. The launcher passes them; nothing else reads `process.env`. */
const schema = z.object({
  NODE_ENV: z.enum(['production', 'test', 'development']).default('production'),
  HOST: z.string().default('127.0.0.1'),
  PORT: z.coerce.number().int().min(0).max(65535).default(4280),
  /** The address readers use, for links in mail and in sheets; the bound address when absent. */
  PUBLIC_URL: z.url().optional(),
  DATABASE_URL: z.url(),
  DIFFOLIO_DATA_DIR: z.string().default('.data'),
  /** The client's build. */
  DIFFOLIO_PAGES_DIR: z.string().default('client/dist'),
  DIFFOLIO_DEMO: flag.default(false),
  /** Signs access tokens; drawn at random when absent, which signs everybody out at a restart. */
  JWT_SECRET: z.string().min(32).optional(),
  /** Memory of one password hash; less only where passwords guard nothing, as in tests. */
  PASSWORD_MEMORY_KIB: z.coerce
    .number()
    .int()
    .min(8)
    .default(64 * 1024),
  S3_ENDPOINT: z.url().optional(),
  S3_BUCKET: z.string().default('diffolio'),
  S3_REGION: z.string().default('us-east-1'),
  S3_ACCESS_KEY_ID: z.string().default('S3RVER'),
  S3_SECRET_ACCESS_KEY: z.string().default('S3RVER'),
  SMTP_URL: z.url().optional(),
  MAIL_FROM: z.string().default('Diffolio <diffolio@localhost.invalid>'),
  DOI_REGISTRAR_URL: z.url().optional(),
  /** 10.5555 is the prefix kept for examples and tests (common practice, no source). */
  DOI_PREFIX: z.string().default('10.5555'),
  LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'silent']).default('info'),
});

export type Env = z.infer<typeof schema>;

/**
 * The settings, checked at the start.
 *
 * @throws {Error} naming every setting that is missing or malformed
 */
export function readEnv(source: Record<string, string | undefined>): Env {
  const given = Object.fromEntries(Object.entries(source).filter(([, value]) => value !== ''));
  const parsed = schema.safeParse(given);
  if (parsed.success) return parsed.data;
  const faults = parsed.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`);
  throw new Error(`The settings are not usable.\n${faults.join('\n')}`);
}
