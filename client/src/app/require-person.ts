import { redirect, type LoaderFunctionArgs } from 'react-router-dom';
import { paths } from '../lib/paths';
import { hasRole, restoreSession, type Role } from '../lib/session';

/** The page is there, but the reader's roles do not open it. */
export class RoleMissing extends Error {}

/**
 * A loader for pages that need a person: leads to sign-in and back, and closes the page to other roles. The service
 * guards its data itself; this only spares the reader a broken page.
 *
 * @throws {RoleMissing} taken by the error element of the route
 */
export const requirePerson =
  (...roles: readonly Role[]) =>
  async ({ request }: LoaderFunctionArgs): Promise<Response | null> => {
    const session = await restoreSession();
    const { pathname, search } = new URL(request.url);
    if (session.status !== 'signedIn') return redirect(paths.signIn(pathname + search));
    if (roles.length > 0 && !hasRole(session.person, ...roles)) throw new RoleMissing();
    return null;
  };
