import { createHash, randomBytes } from 'node:crypto';
import { type Env } from '../config/env.js';

/** Injection token of the key that signs tokens. */
export const SIGNING_KEY = Symbol('SIGNING_KEY');

/** 256 bits, from the set secret, or at random: then a restart makes browsers refresh, and no more. */
export function signingKeyFrom(env: Env): Buffer {
  return env.JWT_SECRET === undefined ? randomBytes(32) : createHash('sha256').update(env.JWT_SECRET).digest();
}
