import { type CanActivate, type ExecutionContext, Injectable, SetMetadata } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { type FastifyRequest } from 'fastify';
import { type GraphQLResolveInfo, OperationTypeNode } from 'graphql';
import passport from 'passport';
import { API_KEY_PREFIX, ApiKeysService } from '../api-keys/api-keys.service.js';
import { ACCESS, type Access } from '../common/access.decorators.js';
import { ApiError } from '../common/api-error.js';
import { type RequestWithViewer, type Viewer, hasRole } from '../common/viewer.js';
import { PublicAddressService } from '../mail/public-address.service.js';
import { ACCESS_TOKEN_STRATEGY } from './access-token.strategy.js';
import { isCrossSite } from './cross-site-rules.js';

const NO_BEARER = 'no-bearer';

/** Leaves the Authorization header unread, where a person whose access token has run out gets a new one. */
export const WithoutBearer = () => SetMetadata(NO_BEARER, true);

type GuardedRequest = FastifyRequest & RequestWithViewer;

const BAD_TOKEN = 'The access token or key is not valid, or no longer.';

/**
 * Decides on every route and every root field of GraphQL who may call it, and tells the request who asks. An operation
 * that states no access rule is refused to everybody. A token or key that is not valid is refused even where none is
 * needed, so that a program learns of it instead of silently seeing less.
 */
@Injectable()
export class AccessGuard implements CanActivate {
  /** Several root fields of one request ask at the same time; one answer serves them all. */
  private readonly viewers = new WeakMap<object, Promise<Viewer | null>>();

  constructor(
    private readonly reflector: Reflector,
    private readonly apiKeys: ApiKeysService,
    private readonly address: PublicAddressService,
  ) {}

  async canActivate(context: ExecutionContext): Promise<boolean> {
    const targets = [context.getHandler(), context.getClass()];
    const access = this.reflector.getAllAndOverride<Access | undefined>(ACCESS, targets);
    if (access === undefined) throw new ApiError('FORBIDDEN', 'Nobody may call this.');
    const isGraphQL = context.getType<'http' | 'graphql'>() === 'graphql';
    const request = requestOf(context, isGraphQL);
    if (!isGraphQL) this.refuseCrossSite(request);
    const readsBearer = this.reflector.getAllAndOverride<boolean | undefined>(NO_BEARER, targets) !== true;
    const viewer = readsBearer ? await this.viewerOf(request) : null;
    request.viewer = viewer;
    // What a visitor may do, a key may do too: computing values from a posted table, for one.
    if (access === 'anyone') return true;
    if (!viewer) throw new ApiError('UNAUTHENTICATED', 'Sign in first.');
    if (viewer.viaApiKey && !isReading(context, request, isGraphQL)) {
      throw new ApiError('FORBIDDEN', 'An API key reads and changes nothing.');
    }
    if (access !== 'signed-in' && !hasRole(viewer, ...access)) {
      throw new ApiError('FORBIDDEN', `This needs one of the roles ${access.join(', ')}.`);
    }
    return true;
  }

  private refuseCrossSite({ method, headers }: GuardedRequest): void {
    const fetchSite = headers['sec-fetch-site'];
    const from = {
      method,
      host: headers.host,
      origin: headers.origin,
      fetchSite: Array.isArray(fetchSite) ? fetchSite.join() : fetchSite,
    };
    if (isCrossSite(from, this.address.origin)) {
      throw new ApiError('FORBIDDEN', 'This request was sent by a page of another site.');
    }
  }

  private viewerOf(request: GuardedRequest): Promise<Viewer | null> {
    const known = this.viewers.get(request);
    if (known) return known;
    const viewer = this.authenticate(request);
    this.viewers.set(request, viewer);
    return viewer;
  }

  private async authenticate(request: GuardedRequest): Promise<Viewer | null> {
    const { authorization } = request.headers;
    if (authorization === undefined) return null;
    const secret = /^Bearer +(\S+)$/i.exec(authorization)?.[1] ?? '';
    const viewer = secret.startsWith(API_KEY_PREFIX)
      ? await this.apiKeys.viewerOf(secret)
      : await viewerByAccessToken(request);
    if (!viewer) throw new ApiError('UNAUTHENTICATED', BAD_TOKEN);
    return viewer;
  }
}

function requestOf(context: ExecutionContext, isGraphQL: boolean): GuardedRequest {
  return isGraphQL
    ? context.getArgByIndex<{ req: GuardedRequest }>(2).req
    : context.switchToHttp().getRequest<GuardedRequest>();
}

function isReading(context: ExecutionContext, request: GuardedRequest, isGraphQL: boolean): boolean {
  if (isGraphQL) return context.getArgByIndex<GraphQLResolveInfo>(3).operation.operation === OperationTypeNode.QUERY;
  return request.method === 'GET' || request.method === 'HEAD';
}

function viewerByAccessToken(request: GuardedRequest): Promise<Viewer | null> {
  return new Promise((resolve, reject) => {
    const done = (error: unknown, viewer?: Viewer | false | null) => {
      if (error) reject(error instanceof Error ? error : new Error('authentication failed'));
      else resolve(viewer || null);
    };
    const handler = passport.authenticate(ACCESS_TOKEN_STRATEGY, { session: false }, done) as (
      request: unknown,
      response: unknown,
      next: (error?: unknown) => void,
    ) => void;
    handler(request, {}, (error) => done(error ?? new Error('authentication gave no answer')));
  });
}
