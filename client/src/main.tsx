import './lib/schemas-without-eval';
import '@fontsource-variable/work-sans/wght.css';
import '@fontsource-variable/work-sans/wght-italic.css';
import './ui/fonts/symbols.css';
import { createRoot } from 'react-dom/client';
import { RouterProvider } from 'react-router-dom';
import { Providers } from './app/providers';
import { applyEdition } from './lib/edition';
import { restoreSession } from './lib/session';
import { createRouter } from './router';

applyEdition();
// Pages for everyone are drawn at once; those that need a person wait for this themselves.
void restoreSession();

const root = document.getElementById('root');
if (root === null) throw new Error('The page has no place for the application.');
createRoot(root).render(
  <Providers>
    <RouterProvider router={createRouter()} />
  </Providers>,
);
