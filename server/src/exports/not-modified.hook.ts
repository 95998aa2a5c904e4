import { Injectable, type OnModuleInit } from '@nestjs/common';
import { HttpAdapterHost } from '@nestjs/core';
import type { FastifyAdapter } from '@nestjs/platform-fastify';
import type { FastifyReply, FastifyRequest } from 'fastify';
import {
  ARCHIVED_CACHING,
  RELEASED_CACHING,
  archivedTag,
  matchesTag,
  releasedTag,
  standingHeaders,
} from './caching-rules.js';
import { ReadableVersionsService } from './readable-versions.service.js';
import { MEDIA_TYPES, negotiate, readVersionAddress } from './representation-rules.js';

interface NotModified {
  readonly tag: string;
  readonly headers: Readonly<Record<string, string>>;
}

const ARCHIVED = /^\/releases\/([0-9a-f]{64})\.(json|pdf)$/;
const VERSION = /^\/sheets\/([^/?]+)\/([^/?]+)(?:\?paper=(a4|letter))?$/i;
const FILES = ['JSON', 'PAGE', 'CSV', 'PDF'] as const;

/**
 * Answers 304 before anything is routed, for documents that are public and whose validator is known from the address alone or from
 * memory. A request that says who it is goes the whole way, through authorisation.
 */
@Injectable()
export class NotModifiedHook implements OnModuleInit {
  constructor(
    private readonly host: HttpAdapterHost<FastifyAdapter>,
    private readonly versions: ReadableVersionsService,
  ) {}

  onModuleInit(): void {
    this.host.httpAdapter.getInstance().addHook('onRequest', (request, reply, done) => {
      const known = this.knownOf(request);
      if (known === null || !matchesTag(request.headers['if-none-match'] ?? '', known.tag)) done();
      else answer(reply, known);
    });
  }

  private knownOf(request: FastifyRequest): NotModified | null {
    const { method, headers, url } = request;
    if (headers['if-none-match'] === undefined || headers.authorization !== undefined) return null;
    if (method !== 'GET' && method !== 'HEAD') return null;
    return archivedAt(url) ?? this.releasedAt(url, headers.accept);
  }

  private releasedAt(url: string, accept: string | undefined): NotModified | null {
    const [, code, address, paper = 'A4'] = VERSION.exec(url) ?? [];
    const asked = readVersionAddress(address ?? '');
    if (code === undefined || asked === null) return null;
    const format = asked.format ?? negotiate(accept, FILES, MEDIA_TYPES);
    const version = this.versions.remembered(code, asked.number);
    if (version === undefined || format === null || format === 'PAGE' || format === 'UNKNOWN') return null;
    return {
      tag: releasedTag(version.standing, version.versions, format, paper),
      headers: {
        'cache-control': RELEASED_CACHING,
        vary: 'Accept',
        ...standingHeaders(version.code, version.standing, version.versions),
      },
    };
  }
}

function archivedAt(url: string): NotModified | null {
  const [, contentHash, extension] = ARCHIVED.exec(url) ?? [];
  if (contentHash === undefined) return null;
  const tag = archivedTag(contentHash, extension === 'pdf' ? 'PDF' : 'JSON');
  return { tag, headers: { 'cache-control': ARCHIVED_CACHING } };
}

function answer(reply: FastifyReply, { tag, headers }: NotModified): void {
  void reply.code(304).headers(headers).header('etag', tag).send();
}
