import { ApolloProvider } from '@apollo/client/react';
import { ChakraProvider } from '@chakra-ui/react';
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { useEffect, useState, type ReactNode } from 'react';
import { createApolloClient } from '../lib/apollo';
import { getSession, subscribe } from '../lib/session';
import { system } from '../ui/theme/system';

/** What every page stands in: the look, the GraphQL client, and the client for files, sign-in and downloads. */
export function Providers({ children }: { readonly children: ReactNode }) {
  const [apollo] = useState(() => createApolloClient());
  const [queries] = useState(
    () => new QueryClient({ defaultOptions: { queries: { retry: 1 }, mutations: { retry: false } } }),
  );
  useEffect(() => {
    // What one person may see is not another's: a change of person empties both caches.
    let person = personId();
    return subscribe(() => {
      const now = personId();
      if (now === person) return;
      person = now;
      void apollo.resetStore();
      queries.clear();
    });
  }, [apollo, queries]);
  return (
    <ChakraProvider value={system}>
      <ApolloProvider client={apollo}>
        <QueryClientProvider client={queries}>{children}</QueryClientProvider>
      </ApolloProvider>
    </ChakraProvider>
  );
}

function personId(): string | null {
  const session = getSession();
  return session.status === 'signedIn' ? session.person.id : null;
}
