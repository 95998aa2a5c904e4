import { HttpProblem, record, request } from '../../lib/http';
import { openSession, type Role, type SignedInPerson } from '../../lib/session';

export interface Invitation {
  readonly email: string;
  readonly roles: readonly Role[];
  readonly expiresAt: string;
}

const post = <T>(name: string, json: object, read: (answer: unknown) => T): Promise<T> =>
  request(`/api/auth/${name}`, { method: 'POST', json }, read);

/** @throws {HttpProblem} 410 when the link is used, replaced or too old */
export const readInvitation = (token: string): Promise<Invitation> => post('invitation', { token }, invitationOf);

export const acceptInvitation = (input: { token: string; name: string; password: string }): Promise<SignedInPerson> =>
  post('accept-invitation', input, openSession);

export const createFirstAdministrator = (input: {
  token: string;
  email: string;
  name: string;
  password: string;
}): Promise<SignedInPerson> => post('first-administrator', input, openSession);

export const requestPasswordReset = (email: string): Promise<null> =>
  // Accepted with an empty body, whether or not there is such an account.
  post('request-password-reset', { email }, () => null);

export const resetPassword = (input: { token: string; password: string }): Promise<null> =>
  post('reset-password', input, () => null);

function invitationOf(answer: unknown): Invitation {
  const { email, roles, expiresAt } = record(answer);
  if (typeof email !== 'string' || !Array.isArray(roles) || typeof expiresAt !== 'string') {
    throw new HttpProblem(502, 'The service gave an unreadable answer.');
  }
  return { email, roles: roles as Role[], expiresAt };
}
