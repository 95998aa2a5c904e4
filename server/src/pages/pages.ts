import fs from 'node:fs';
import path from 'node:path';
import fastifyStatic from '@fastify/static';
import { type NestFastifyApplication } from '@nestjs/platform-fastify';
import { type FastifyReply, type FastifyRequest } from 'fastify';

/** Names of built assets carry a hash of their content. */
const ASSETS = '/assets/';
const ONE_YEAR_SECONDS = 31_536_000;

/** Addresses that programs use; what is not there is a 404, never a page. */
const NOT_A_PAGE = /^\/(api|graphql|health|releases|assets)(\/|$)/;

/** Does this request come from somebody with a browser in front of them? */
export function wantsPage(request: FastifyRequest): boolean {
  const isReading = request.method === 'GET' || request.method === 'HEAD';
  return isReading && (request.headers.accept ?? '').includes('text/html');
}

/** Sends a page of the client's build; the page itself is never kept, so that a new build is seen at once. */
export async function sendPage(reply: FastifyReply, name: 'index.html' | 'graphql.html' = 'index.html'): Promise<void> {
  await reply.header('cache-control', 'no-cache').sendFile(name, { cacheControl: false });
}

/** Serves the client's build: its assets for ever, the explorer at /graphql, one page for every other address. */
export async function servePages(app: NestFastifyApplication, folder: string): Promise<void> {
  const root = path.resolve(folder);
  if (!fs.existsSync(path.join(root, 'index.html'))) return;
  await app.register(fastifyStatic, {
    root,
    wildcard: false,
    index: false,
    cacheControl: false,
    setHeaders: (reply, file) => {
      const isAsset = file.startsWith(path.join(root, ASSETS));
      void reply.header('cache-control', isAsset ? `public, max-age=${ONE_YEAR_SECONDS}, immutable` : 'no-cache');
    },
  });
  const fastify = app.getHttpAdapter().getInstance();
  fastify.addHook('onRequest', async (request, reply) => {
    const address = request.url.split('?')[0] ?? '';
    if (address === '/graphql' && wantsPage(request)) return sendPage(reply, 'graphql.html');
    // What no route claims is an address of the client's own.
    if (request.is404 && wantsPage(request) && !NOT_A_PAGE.test(address)) return sendPage(reply);
    return undefined;
  });
}
