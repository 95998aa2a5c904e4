import { Inject, Injectable } from '@nestjs/common';
import { PassportStrategy } from '@nestjs/passport';
import { ExtractJwt, Strategy } from 'passport-jwt';
import { isId } from '../common/graphql/node.js';
import { type Viewer } from '../common/viewer.js';
import { SessionsService } from './sessions.service.js';
import { SIGNING_KEY } from './signing-key.js';
import { ACCESS_TOKEN, ALGORITHM, ISSUER } from './token-kinds.js';

export const ACCESS_TOKEN_STRATEGY = 'access-token';

interface VerifiedToken {
  readonly header: { readonly typ?: unknown };
  readonly payload: { readonly sub?: unknown; readonly sid?: unknown; readonly exp?: unknown };
}

/** Signature, algorithm, issuer, audience and times are checked by passport-jwt; kind and session here. */
@Injectable()
export class AccessTokenStrategy extends PassportStrategy(Strategy, ACCESS_TOKEN_STRATEGY) {
  constructor(
    @Inject(SIGNING_KEY) signingKey: Buffer,
    private readonly sessions: SessionsService,
  ) {
    super({
      jwtFromRequest: ExtractJwt.fromAuthHeaderAsBearerToken(),
      secretOrKey: signingKey,
      algorithms: [ALGORITHM],
      issuer: ISSUER,
      audience: ACCESS_TOKEN.audience,
      jsonWebTokenOptions: { complete: true },
    });
  }

  /** The session is looked up every time, so that signing out and disabling an account take effect at once. */
  async validate({ header, payload }: VerifiedToken): Promise<Viewer | null> {
    const { sub, sid, exp } = payload;
    if (header.typ !== ACCESS_TOKEN.typ || typeof exp !== 'number') return null;
    if (typeof sub !== 'string' || typeof sid !== 'string' || !isId(sub) || !isId(sid)) return null;
    return this.sessions.viewerOf(sid, sub);
  }
}
