import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { getIntrospectionQuery } from 'graphql';
import request from 'supertest';
import { DataSource } from 'typeorm';
import { startTestApp, type TestApp } from './app.js';

describe('the limits of the GraphQL API', () => {
  let testApp: TestApp;

  beforeAll(async () => {
    testApp = await startTestApp();
  });

  afterAll(() => testApp.close());

  const ask = (body: object) => request(testApp.app.getHttpServer()).post('/graphql').send(body);
  const codeOf = (response: request.Response): unknown => response.body.errors?.[0]?.extensions?.code;

  const many = (count: number, part: (i: number) => string) =>
    Array.from({ length: count }, (_, i) => part(i)).join(' ');
  const nested = (depth: number) =>
    `{ pair(a: {name: "a"}, b: {name: "b"}) { ${'series(first: 1) { edges { node { pair { '.repeat(depth)} id ${'} } } } '.repeat(depth)} } }`;

  it.each([
    ['more than 1,000 tokens', `{ ${many(600, (i) => `f${i}: __typename`)} }`],
    ['more than 15 aliases', `{ ${many(20, (i) => `s${i}: substances { totalCount }`)} }`],
    ['deep nesting', nested(6)],
    ['a costly nest of lists', nested(3).replaceAll('first: 1', 'first: 100')],
  ])('refuses a query with %s before it runs', async (_, query) => {
    const response = await ask({ query });
    expect(codeOf(response)).toBe('QUERY_TOO_COSTLY');
    expect(response.body.data ?? null).toBeNull();
  });

  it('counts a page size that comes in by a variable', async () => {
    const query = nested(2).replaceAll('first: 1', 'first: $n').replace('{', 'query ($n: Int) {');
    expect(codeOf(await ask({ query, variables: { n: 100 } }))).toBe('QUERY_TOO_COSTLY');
    expect(codeOf(await ask({ query, variables: { n: 1 } }))).toBeUndefined();
  });

  it('lets a full page of sheets with their correlations through', async () => {
    const query = `{ dataSheets(first: 100) { edges { node { code pair { substances { name formula } } current { number releasedAt
      correlation { expression parameters { symbol value standardUncertainty unit } covariance validity { temperatureMinimum
      temperatureMaximum pressureMinimum pressureMaximum } evaluate(temperatures: [300], pressures: [101325]) { diffusivities
      standardUncertainties } } } } } } }`;
    expect((await ask({ query })).body).toEqual({ data: { dataSheets: { edges: [] } } });
  });

  it('answers introspection, because the contract is public', async () => {
    const response = await ask({ query: getIntrospectionQuery({ inputValueDeprecation: true, oneOf: true }) });
    expect(response.status).toBe(200);
    expect(response.body.data.__schema.types.length).toBeGreaterThan(50);
  });

  it('refuses a body over 1 MiB', async () => {
    const response = await ask({ query: '{ __typename }', variables: { padding: 'x'.repeat(1_100_000) } });
    expect(response.status).toBe(413);
  });

  it('runs no batch, no mutation by GET and no form that a foreign page could send', async () => {
    const server = testApp.app.getHttpServer();
    expect(
      (
        await request(server)
          .post('/graphql')
          .send([{ query: '{ __typename }' }])
      ).status,
    ).toBe(400);
    const query = encodeURIComponent('mutation { submitSeries(id: "1") { problems { code } } }');
    expect((await request(server).get(`/graphql?query=${query}`).set('apollo-require-preflight', '1')).status).toBe(
      405,
    );
    const plain = await request(server)
      .post('/graphql')
      .set('content-type', 'text/plain')
      .send('{"query":"{ __typename }"}');
    expect(plain.status).toBeGreaterThanOrEqual(400);
  });

  it('names the codes of GraphQL’s own refusals', async () => {
    expect(codeOf(await ask({ query: '{ nothing' }))).toBe('GRAPHQL_PARSE_FAILED');
    expect(codeOf(await ask({ query: '{ nothing }' }))).toBe('GRAPHQL_VALIDATION_FAILED');
    const twoNames = '{ pair(a: {name: "a", casNumber: "b"}, b: {name: "b"}) { id } }';
    expect(codeOf(await ask({ query: twoNames }))).toBe('GRAPHQL_VALIDATION_FAILED');
  });

  it.each([
    ['missing', {}],
    ['null', { id: null }],
    ['of another type', { id: { a: 1 } }],
  ])('calls a variable that is %s the caller’s mistake', async (_, variables) => {
    const query = 'mutation ($id: ID!) { submitSeries(id: $id) { problems { code } } }';
    const response = await ask({ query, variables });
    expect(response.status).toBe(400);
    expect(response.body.errors).toEqual([
      { message: expect.stringContaining('$id'), locations: expect.anything(), extensions: { code: 'BAD_USER_INPUT' } },
    ]);
  });

  it('says nothing of an unexpected error', async () => {
    const dataSource = testApp.app.get(DataSource);
    await dataSource.query('ALTER TABLE substances RENAME TO substances_elsewhere');
    const response = await ask({ query: '{ substances { totalCount } }' });
    await dataSource.query('ALTER TABLE substances_elsewhere RENAME TO substances');
    expect(codeOf(response)).toBe('INTERNAL');
    expect(JSON.stringify(response.body)).not.toMatch(/substances_elsewhere|relation|SELECT|node_modules/);
  });
});
