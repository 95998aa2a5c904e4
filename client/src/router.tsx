import { createBrowserRouter, type RouteObject } from 'react-router-dom';
import { Layout } from './app/layout';
import { requirePerson } from './app/require-person';
import { NotFound, RouteError } from './app/route-error';

/** One file per address; each is loaded when its address is opened. */
const routes: RouteObject[] = [
  { index: true, lazy: () => import('./routes/catalogue') },
  { path: 'sheets/:code', lazy: () => import('./routes/sheet') },
  { path: 'sheets/:code/:number', lazy: () => import('./routes/sheet') },
  { path: 'sign-in', lazy: () => import('./routes/sign-in') },
  { path: 'invitation/:token', lazy: () => import('./routes/invitation') },
  { path: 'reset-password', lazy: () => import('./routes/forgotten-password') },
  { path: 'reset-password/:token', lazy: () => import('./routes/reset-password') },
  { path: 'api', lazy: () => import('./routes/api-guide') },
  { path: 'substances', lazy: () => import('./routes/substances') },
  {
    path: 'substances/new',
    loader: requirePerson('RESEARCHER', 'EDITOR'),
    lazy: () => import('./routes/new-substance'),
  },
  { path: 'substances/:id', lazy: () => import('./routes/substance') },
  {
    path: 'substances/:id/edit',
    loader: requirePerson('RESEARCHER', 'EDITOR'),
    lazy: () => import('./routes/edit-substance'),
  },
  { path: 'home', loader: requirePerson(), lazy: () => import('./routes/home') },
];

export const createRouter = () =>
  createBrowserRouter([
    {
      element: <Layout />,
      children: [{ errorElement: <RouteError />, children: [...routes, { path: '*', element: <NotFound /> }] }],
    },
  ]);
