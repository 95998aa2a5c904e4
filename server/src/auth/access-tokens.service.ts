import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';
import { ACCESS_TOKEN, DEVICE_TOKEN } from './token-kinds.js';

interface DeviceClaims {
  readonly sub: string;
  readonly jti: string;
}

/** Signs what the browser keeps: short-lived access tokens, and the mark of a device that its person has signed in from. */
@Injectable()
export class AccessTokensService {
  constructor(private readonly jwt: JwtService) {}

  sign(personId: string, sessionId: string): Promise<string> {
    const { typ, audience, lifeSeconds } = ACCESS_TOKEN;
    return this.jwt.signAsync(
      { sid: sessionId },
      { subject: personId, audience, expiresIn: lifeSeconds, header: { alg: 'HS256', typ } },
    );
  }

  signDevice(personId: string): Promise<string> {
    const { typ, audience, lifeSeconds } = DEVICE_TOKEN;
    return this.jwt.signAsync(
      {},
      { subject: personId, jwtid: randomUUID(), audience, expiresIn: lifeSeconds, header: { alg: 'HS256', typ } },
    );
  }

  /** The device's own id when the mark is genuine and this person's, else null. */
  async deviceOf(token: string | undefined, personId: string | null): Promise<string | null> {
    if (token === undefined || personId === null) return null;
    try {
      const claims = await this.jwt.verifyAsync<DeviceClaims>(token, { audience: DEVICE_TOKEN.audience });
      return claims.sub === personId ? claims.jti : null;
    } catch {
      return null;
    }
  }
}
