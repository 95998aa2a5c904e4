import { ChakraProvider } from '@chakra-ui/react';
import { type ReactNode } from 'react';
import { MemoryRouter } from 'react-router-dom';
import { system } from '../theme/system';

/** What a component needs around it in a test: the look and a router. */
export const WithProviders = ({ children, at = '/' }: { readonly children: ReactNode; readonly at?: string }) => (
  <ChakraProvider value={system}>
    <MemoryRouter initialEntries={[at]}>{children}</MemoryRouter>
  </ChakraProvider>
);
