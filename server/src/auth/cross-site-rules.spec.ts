import { isCrossSite, type RequestOrigin } from './cross-site-rules.js';

const OWN = 'https://sheets.example';
const post = (from: Partial<RequestOrigin>): RequestOrigin => ({
  method: 'POST',
  host: '127.0.0.1:4280',
  origin: undefined,
  fetchSite: undefined,
  ...from,
});

describe('a request that changes something', () => {
  it.each<[string, Partial<RequestOrigin>]>([
    ['of a program, which says nothing of an origin', {}],
    ['of a page at the address it was sent to', { origin: 'http://127.0.0.1:4280', fetchSite: 'same-origin' }],
    ['of a page at the public address, behind a proxy', { origin: OWN }],
    ['typed into the address bar', { fetchSite: 'none' }],
  ])('%s is not cross-site', (_, from) => {
    expect(isCrossSite(post(from), OWN)).toBe(false);
  });

  it.each<[string, Partial<RequestOrigin>]>([
    ['of another origin', { origin: 'https://evil.example' }],
    ['of another port', { origin: 'http://127.0.0.1:4281' }],
    ['of an origin that only begins alike', { origin: 'https://sheets.example.evil.example' }],
    ['of a sandboxed page', { origin: 'null' }],
    ['of a sibling of this site', { origin: OWN, fetchSite: 'same-site' }],
    ['of another site that hides its origin', { fetchSite: 'cross-site' }],
    ['with an origin but without a host', { origin: 'https://evil.example', host: undefined }],
  ])('%s is cross-site', (_, from) => {
    expect(isCrossSite(post(from), OWN)).toBe(true);
  });

  it('is not one that only reads', () => {
    expect(isCrossSite(post({ method: 'GET', origin: 'https://evil.example', fetchSite: 'cross-site' }), OWN)).toBe(
      false,
    );
  });
});
