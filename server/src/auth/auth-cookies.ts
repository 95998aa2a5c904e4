import { type CookieSerializeOptions } from '@fastify/cookie';
import { type FastifyReply, type FastifyRequest } from 'fastify';
import { SESSION_DAYS } from './sessions.service.js';
import { DEVICE_TOKEN } from './token-kinds.js';

/** `__Host-` binds a cookie to this host, the whole path and a secure channel; browsers count loopback as one. */
const REFRESH = '__Host-diffolio-refresh';
const DEVICE = '__Host-diffolio-device';

const OPTIONS: CookieSerializeOptions = { path: '/', httpOnly: true, secure: true, sameSite: 'strict' };

export function refreshTokenOf(request: FastifyRequest): string | undefined {
  return request.cookies[REFRESH];
}

export function deviceTokenOf(request: FastifyRequest): string | undefined {
  return request.cookies[DEVICE];
}

export function setRefreshToken(reply: FastifyReply, token: string): void {
  void reply.setCookie(REFRESH, token, { ...OPTIONS, maxAge: SESSION_DAYS * 24 * 3600 });
}

export function clearRefreshToken(reply: FastifyReply): void {
  void reply.clearCookie(REFRESH, OPTIONS);
}

export function setDeviceToken(reply: FastifyReply, token: string): void {
  void reply.setCookie(DEVICE, token, { ...OPTIONS, maxAge: DEVICE_TOKEN.lifeSeconds });
}
