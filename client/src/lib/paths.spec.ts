import { expect, it } from 'vitest';
import { paths, safeNext } from './paths';

it('builds the addresses that the contract names', () => {
  expect(paths.version('DS-0042', '2.1')).toBe('/sheets/DS-0042/2.1');
  expect(paths.versionFile('DS-0042', '2.1', 'pdf')).toBe('/sheets/DS-0042/2.1.pdf');
  expect(paths.release('7c1e04b9', 'json')).toBe('/releases/7c1e04b9.json');
  expect(paths.explorer()).toBe('/graphql');
});

it('escapes what people typed', () => {
  expect(paths.catalogue('water + air & co')).toBe('/?search=water%20%2B%20air%20%26%20co');
  expect(paths.substance('a/b')).toBe('/substances/a%2Fb');
});

it('brings a person back to the page that asked for the sign-in', () => {
  expect(paths.signIn('/pairs/1?x=2')).toBe('/sign-in?next=%2Fpairs%2F1%3Fx%3D2');
  expect(safeNext('/pairs/1?x=2', '/home')).toBe('/pairs/1?x=2');
});

it.each(['https://elsewhere.example', '//elsewhere.example', '/\\elsewhere.example', 'pairs', null])(
  'never leads from the sign-in to %s',
  (next) => {
    expect(safeNext(next, '/home')).toBe('/home');
  },
);
