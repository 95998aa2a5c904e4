import 'reflect-metadata';
import fastifyCookie from '@fastify/cookie';
import fastifyHelmet from '@fastify/helmet';
import fastifyMultipart from '@fastify/multipart';
import { ConsoleLogger, type LogLevel, type LoggerService } from '@nestjs/common';
import { NestFactory } from '@nestjs/core';
import { FastifyAdapter, type NestFastifyApplication } from '@nestjs/platform-fastify';
import { AppModule } from './app.module.js';
import { ProblemDetailsFilter } from './common/problem-details.filter.js';
import { type Env } from './config/env.js';
import { servePages } from './pages/pages.js';

const BODY_LIMIT_BYTES = 1024 * 1024;
const UPLOAD_LIMIT_BYTES = 20 * 1024 * 1024;
const REQUEST_TIMEOUT_MS = 30_000;

/** Everything comes from this server; styles are injected by the component library. */
const CONTENT_SECURITY_POLICY = {
  useDefaults: false,
  directives: {
    defaultSrc: ["'none'"],
    scriptSrc: ["'self'"],
    styleSrc: ["'self'", "'unsafe-inline'"],
    imgSrc: ["'self'", 'data:', 'blob:'],
    fontSrc: ["'self'", 'data:'],
    connectSrc: ["'self'"],
    workerSrc: ["'self'", 'blob:'],
    manifestSrc: ["'self'"],
    objectSrc: ["'none'"],
    baseUri: ["'none'"],
    formAction: ["'self'"],
    frameAncestors: ["'none'"],
  },
};

const LOG_LEVELS: Record<Env['LOG_LEVEL'], LogLevel[]> = {
  silent: [],
  fatal: ['fatal'],
  error: ['fatal', 'error'],
  warn: ['fatal', 'error', 'warn'],
  info: ['fatal', 'error', 'warn', 'log'],
  debug: ['fatal', 'error', 'warn', 'log', 'debug'],
};

/** One line of JSON an entry, on stderr: stdout is for the launcher's own words. */
function jsonLogger(level: Env['LOG_LEVEL']): LoggerService {
  return new ConsoleLogger({ json: true, colors: false, compact: true, logLevels: LOG_LEVELS[level] });
}

/** The whole server, ready to listen. Tests and the start command build it the same way. */
export async function createApp(env: Env): Promise<NestFastifyApplication> {
  const adapter = new FastifyAdapter({
    bodyLimit: BODY_LIMIT_BYTES,
    requestTimeout: REQUEST_TIMEOUT_MS,
    trustProxy: false,
  });
  const app = await NestFactory.create<NestFastifyApplication>(AppModule.with(env), adapter, {
    logger: jsonLogger(env.LOG_LEVEL),
    abortOnError: false,
  });
  await app.register(fastifyCookie);
  await app.register(fastifyMultipart, { limits: { fileSize: UPLOAD_LIMIT_BYTES, files: 1 } });
  await app.register(fastifyHelmet, {
    contentSecurityPolicy: CONTENT_SECURITY_POLICY,
    strictTransportSecurity: false,
    crossOriginEmbedderPolicy: false,
    referrerPolicy: { policy: 'same-origin' },
  });
  await servePages(app, env.DIFFOLIO_PAGES_DIR);
  app.useGlobalFilters(new ProblemDetailsFilter());
  app.enableShutdownHooks();
  return app;
}
