import { ApolloClient, ApolloLink, CombinedGraphQLErrors, HttpLink, InMemoryCache } from '@apollo/client';
import { SetContextLink } from '@apollo/client/link/context';
import { ErrorLink } from '@apollo/client/link/error';
import { from, switchMap, throwError } from 'rxjs';
import { accessToken, refreshSession } from './session';

/** `extensions.code` of the first GraphQL error, or null for anything else. */
export function errorCode(error: unknown): string | null {
  const code = CombinedGraphQLErrors.is(error) ? error.errors[0]?.extensions?.['code'] : null;
  return typeof code === 'string' ? code : null;
}

/** What a failed operation says to the reader. */
export function errorMessage(error: unknown): string {
  if (CombinedGraphQLErrors.is(error)) return error.errors[0]?.message ?? error.message;
  return 'The service cannot be reached. Nothing is lost; try again.';
}

const withToken = new SetContextLink(({ headers }) => {
  const token = accessToken();
  const known: unknown = headers;
  return { headers: { ...(known as Record<string, string>), ...(token ? { authorization: `Bearer ${token}` } : {}) } };
});

/** An access token lives for minutes: refresh it and ask once more. */
const retryAfterRefresh = new ErrorLink(({ error, operation, forward }) => {
  if (errorCode(error) !== 'UNAUTHENTICATED' || operation.getContext()['retried'] === true) return;
  if (accessToken() === null) return;
  operation.setContext({ retried: true });
  return from(refreshSession()).pipe(
    switchMap((refreshed) => (refreshed ? forward(operation) : throwError(() => error))),
  );
});

export const createApolloClient = (terminating: ApolloLink = new HttpLink({ uri: '/graphql' })): ApolloClient =>
  new ApolloClient({
    link: ApolloLink.from([retryAfterRefresh, withToken, terminating]),
    cache: new InMemoryCache({
      typePolicies: {
        // Parts of a whole: they have no identity of their own and are replaced with it.
        DataSheetVersion: { fields: { content: { merge: false } } },
        Correlation: { merge: true },
      },
    }),
  });
