import { Injectable } from '@nestjs/common';
import { type FastifyReply, type FastifyRequest } from 'fastify';
import { type RoleName } from '../common/viewer.js';
import { PeopleService } from '../people/people.service.js';
import { AccessTokensService } from './access-tokens.service.js';
import { deviceTokenOf, setDeviceToken, setRefreshToken } from './auth-cookies.js';
import { type OpenSession } from './sessions.service.js';
import { ACCESS_TOKEN } from './token-kinds.js';

export interface SessionAnswer {
  readonly accessToken: string;
  /** s */
  readonly expiresIn: number;
  readonly person: { readonly id: string; readonly name: string; readonly roles: readonly RoleName[] };
}

/** What a session is answered with: the access token in the body, the refresh token in its cookie. */
@Injectable()
export class SessionAnswersService {
  constructor(
    private readonly tokens: AccessTokensService,
    private readonly people: PeopleService,
  ) {}

  /** After a sign-in, which also makes this device a known one. */
  async begin(session: OpenSession, request: FastifyRequest, reply: FastifyReply): Promise<SessionAnswer> {
    const known = await this.tokens.deviceOf(deviceTokenOf(request), session.personId);
    if (known === null) setDeviceToken(reply, await this.tokens.signDevice(session.personId));
    return this.carryOn(session, reply);
  }

  async carryOn({ personId, sessionId, refreshToken }: OpenSession, reply: FastifyReply): Promise<SessionAnswer> {
    const person = await this.people.find(personId);
    if (!person) throw new Error('a session without its person');
    setRefreshToken(reply, refreshToken);
    return {
      accessToken: await this.tokens.sign(personId, sessionId),
      expiresIn: ACCESS_TOKEN.lifeSeconds,
      person: { id: person.id, name: person.name, roles: person.roles },
    };
  }
}
