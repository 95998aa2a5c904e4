import { z } from 'zod';
import { ApiError } from '../common/api-error.js';

/** Longer than any password that is accepted; keeps hashing cheap. */
const LONGEST_TEXT = 1024;
const text = z.string().max(LONGEST_TEXT);

export const SignInBody = z.object({ email: text, password: text });
export const EmailBody = z.object({ email: text });
export const TokenBody = z.object({ token: text });
export const AcceptInvitationBody = z.object({ token: text, name: text, password: text });
export const FirstAdministratorBody = z.object({ token: text, email: text, name: text, password: text });
export const ResetPasswordBody = z.object({ token: text, password: text });
export const ChangePasswordBody = z.object({ currentPassword: text, password: text });

/** @throws {ApiError} BAD_USER_INPUT naming the first member that is missing or malformed */
export function readBody<T>(schema: z.ZodType<T>, body: unknown): T {
  const parsed = schema.safeParse(body);
  if (parsed.success) return parsed.data;
  const issue = parsed.error.issues[0];
  const where = issue?.path.join('.') || 'the body';
  throw new ApiError('BAD_USER_INPUT', `${where}: ${issue?.message ?? 'malformed'}. A JSON object is expected.`);
}
