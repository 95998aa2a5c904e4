import { createBrowserRouter, type RouteObject } from 'react-router-dom';
import { Layout } from './app/layout';
import { requirePerson } from './app/require-person';
import { NotFound, RouteError } from './app/route-error';

const editors = requirePerson('EDITOR');
const administrators = requirePerson('ADMINISTRATOR');

/** Pages of those who measure and those who edit. */
const work = (pages: readonly RouteObject[]): RouteObject[] =>
  pages.map((page) => ({ loader: requirePerson('RESEARCHER', 'EDITOR'), ...page }));

/** One file per address; each is loaded when its address is opened. */
const routes: RouteObject[] = [
  { index: true, lazy: () => import('./routes/catalogue') },
  { path: 'sheets/:code', lazy: () => import('./routes/sheet') },
  { path: 'sheets/:code/:number', lazy: () => import('./routes/sheet') },
  { path: 'sign-in', lazy: () => import('./routes/sign-in') },
  { path: 'invitation/:token', lazy: () => import('./routes/invitation') },
  { path: 'reset-password', lazy: () => import('./routes/forgotten-password') },
  { path: 'reset-password/:token', lazy: () => import('./routes/reset-password') },
  { path: 'first-administrator/:token', lazy: () => import('./routes/first-administrator') },
  { path: 'api-guide', lazy: () => import('./routes/api-guide') },
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
  { path: 'people', loader: administrators, lazy: () => import('./routes/people') },
  { path: 'mail', loader: administrators, lazy: () => import('./routes/mail') },
  { path: 'jobs', loader: administrators, lazy: () => import('./routes/jobs') },
  ...work([
    { path: 'pairs', lazy: () => import('./routes/pairs') },
    { path: 'pairs/:id', lazy: () => import('./routes/pair') },
    { path: 'series', lazy: () => import('./routes/series-list') },
    { path: 'bring-in', lazy: () => import('./routes/bring-in') },
    { path: 'series/:id', lazy: () => import('./routes/series') },
    { path: 'series/:id/edit', lazy: () => import('./routes/edit-series') },
    { path: 'fits/compare', lazy: () => import('./routes/compare-fits') },
    { path: 'fits/:id', lazy: () => import('./routes/fit') },
    { path: 'fits/:id/draft', loader: editors, lazy: () => import('./routes/draft-version') },
    { path: 'versions/:id/edit', loader: editors, lazy: () => import('./routes/edit-version') },
    { path: 'versions/:id/review', loader: editors, lazy: () => import('./routes/review') },
    { path: 'versions/:id/release', loader: editors, lazy: () => import('./routes/release') },
    { path: 'versions/:id/withdraw', loader: editors, lazy: () => import('./routes/withdraw') },
  ]),
];

export const createRouter = () =>
  createBrowserRouter([
    {
      element: <Layout />,
      HydrateFallback: () => null,
      children: [{ errorElement: <RouteError />, children: [...routes, { path: '*', element: <NotFound /> }] }],
    },
  ]);
