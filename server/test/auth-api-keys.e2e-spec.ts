import { createHash } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { codeOf, RunningServer, type SignedIn } from './running-server.js';

const CREATE = `mutation ($name: String!, $days: Int) {
  createApiKey(name: $name, expiresInDays: $days) {
    apiKey { id name prefix createdAt lastUsedAt expiresAt revokedAt } secret problems { code path }
  }
}`;
const REVOKE = 'mutation ($id: ID!) { revokeApiKey(id: $id) { apiKey { revokedAt } secret problems { code } } }';
const LIST = '{ apiKeys { name prefix lastUsedAt revokedAt } }';
const ME = '{ me { name roles } }';

describe('an API key', () => {
  let server: RunningServer;
  let modeller: SignedIn;
  const asModeller = (query: string, variables: object = {}) => server.ask(query, variables, modeller.accessToken);
  const aKey = async (name: string, days?: number): Promise<{ id: string; secret: string }> => {
    const { data } = await asModeller(CREATE, { name, days });
    return { id: data!.createApiKey.apiKey.id, secret: data!.createApiKey.secret };
  };

  beforeAll(async () => {
    server = await RunningServer.start();
    await server.addPerson('modeller@group.example', 'MODELLER');
    modeller = await server.signIn('modeller@group.example');
  });
  afterAll(() => server.stop());

  it('is shown once, named, and speaks for its owner', async () => {
    const { data } = await asModeller(CREATE, { name: ' reactor model ' });
    const { apiKey, secret, problems } = data!.createApiKey;

    expect(problems).toEqual([]);
    expect(secret).toMatch(/^dfl_[\w-]{43}$/);
    expect(apiKey).toMatchObject({
      name: 'reactor model',
      prefix: secret.slice(0, 8),
      lastUsedAt: null,
      expiresAt: null,
      revokedAt: null,
    });
    expect((await server.ask(ME, {}, secret)).data!.me).toEqual({ name: 'modeller', roles: ['MODELLER'] });
    expect(JSON.stringify(await asModeller(LIST))).not.toContain(secret);
  });

  it('is stored as a hash alone', async () => {
    const { secret } = await aKey('hashed');
    const [row] = await server.sql<{ plain: number; hashed: number }>(
      `SELECT (count(*) FILTER (WHERE k::text LIKE $1))::int AS plain,
              (count(*) FILTER (WHERE token_hash = $2))::int AS hashed FROM api_keys k`,
      [`%${secret.slice(10)}%`, createHash('sha256').update(secret).digest('hex')],
    );
    expect(row).toEqual({ plain: 0, hashed: 1 });
  });

  it('reads and changes nothing, whatever its owner may', async () => {
    await server.addPerson('mighty@group.example', 'MODELLER', 'RESEARCHER', 'EDITOR', 'ADMINISTRATOR');
    const mighty = await server.signIn('mighty@group.example');
    const { data } = await server.ask(CREATE, { name: 'mighty' }, mighty.accessToken);
    const { secret, apiKey } = data!.createApiKey;

    expect(codeOf(await server.ask('{ people { id } }', {}, secret))).toBeUndefined();
    expect(codeOf(await server.ask(CREATE, { name: 'a key made with a key' }, secret))).toBe('FORBIDDEN');
    expect(codeOf(await server.ask(REVOKE, { id: apiKey.id }, secret))).toBe('FORBIDDEN');
    expect(
      codeOf(
        await server.ask(
          `mutation { invitePerson(input: { email: "x@group.example", roles: [EDITOR] }) { person { id } } }`,
          {},
          secret,
        ),
      ),
    ).toBe('FORBIDDEN');
    const bearer = { Authorization: `Bearer ${secret}` };
    expect((await server.http.get('/api/auth/sessions').set(bearer)).status).toBe(200);
    expect((await server.http.post('/api/auth/change-password').set(bearer).send({})).status).toBe(403);
    expect((await server.http.delete(`/api/auth/sessions/${crypto.randomUUID()}`).set(bearer)).status).toBe(403);
    expect((await server.http.get('/api/mail').set(bearer)).status).toBe(403);
  });

  it('shows when it was last used, written at most once a minute', async () => {
    const { secret, id } = await aKey('watched');
    const lastUse = async () =>
      (await server.sql<{ at: Date | null }>('SELECT last_used_at AS at FROM api_keys WHERE id = $1', [id]))[0]!.at;
    expect(await lastUse()).toBeNull();

    await server.ask(ME, {}, secret);
    const first = await lastUse();
    await server.ask(ME, {}, secret);
    expect(first).not.toBeNull();
    expect(await lastUse()).toEqual(first);

    await server.sql(`UPDATE api_keys SET last_used_at = now() - interval '61 seconds' WHERE id = $1`, [id]);
    await server.ask(ME, {}, secret);
    expect((await lastUse())!.getTime()).toBeGreaterThanOrEqual(first!.getTime());
  });

  it('ends at once when it is revoked, and stays in the list', async () => {
    const { secret, id } = await aKey('old cluster');

    const revoked = await asModeller(REVOKE, { id });

    expect(revoked.data!.revokeApiKey).toEqual({
      apiKey: { revokedAt: expect.any(String) },
      secret: null,
      problems: [],
    });
    expect(codeOf(await server.ask(ME, {}, secret))).toBe('UNAUTHENTICATED');
    expect((await asModeller(LIST)).data!.apiKeys).toContainEqual(
      expect.objectContaining({ name: 'old cluster', revokedAt: expect.any(String) }),
    );
    expect((await asModeller(REVOKE, { id })).data!.revokeApiKey.apiKey).toEqual(revoked.data!.revokeApiKey.apiKey);
  });

  it('ends by itself where a life was given', async () => {
    const { secret, id } = await aKey('for a year', 365);
    expect(codeOf(await server.ask(ME, {}, secret))).toBeUndefined();

    await server.sql('UPDATE api_keys SET expires_at = now() WHERE id = $1', [id]);

    expect(codeOf(await server.ask(ME, {}, secret))).toBe('UNAUTHENTICATED');
  });

  it('stops with its owner', async () => {
    const owner = await server.addPerson('leaving@group.example', 'MODELLER');
    const { accessToken } = await server.signIn('leaving@group.example');
    const { secret } = (await server.ask(CREATE, { name: 'leaving' }, accessToken)).data!.createApiKey;

    await server.sql('UPDATE people SET disabled_at = now() WHERE id = $1', [owner]);

    expect(codeOf(await server.ask(ME, {}, secret))).toBe('UNAUTHENTICATED');
  });

  it('that nobody has is refused even where anyone may ask, over GraphQL and HTTP', async () => {
    const unknown = `dfl_${'A'.repeat(43)}`;
    expect(codeOf(await server.ask(ME, {}, unknown))).toBe('UNAUTHENTICATED');
    expect((await server.http.get('/health/live').set('Authorization', `Bearer ${unknown}`)).status).toBe(401);
  });

  it('of somebody else is neither listed nor revoked', async () => {
    const { id, secret } = await aKey('mine');
    await server.addPerson('other@group.example', 'MODELLER');
    const other = await server.signIn('other@group.example');

    expect((await server.ask(LIST, {}, other.accessToken)).data!.apiKeys).toEqual([]);
    expect(codeOf(await server.ask(REVOKE, { id }, other.accessToken))).toBe('NOT_FOUND');
    expect(codeOf(await server.ask(REVOKE, { id: 'no id' }, other.accessToken))).toBe('NOT_FOUND');
    expect(codeOf(await server.ask(ME, {}, secret))).toBeUndefined();
  });

  it.each([
    ['no name', { name: '  ' }, 'BAD_INPUT', 'name'],
    ['a name too long', { name: 'n'.repeat(101) }, 'BAD_INPUT', 'name'],
    ['the name of another one', { name: 'hashed' }, 'DUPLICATE', 'name'],
    ['a life of no days', { name: 'brief', days: 0 }, 'BAD_INPUT', 'expiresInDays'],
    ['a life too long', { name: 'eternal', days: 100_000 }, 'BAD_INPUT', 'expiresInDays'],
  ])('is not made with %s', async (_, variables, code, path) => {
    const { data } = await asModeller(CREATE, variables);
    expect(data!.createApiKey).toEqual({ apiKey: null, secret: null, problems: [{ code, path }] });
  });

  it('is made once where two requests ask for the same name', async () => {
    const answers = await Promise.all([1, 2, 3].map(() => asModeller(CREATE, { name: 'contested' })));
    expect(answers.filter(({ data }) => data!.createApiKey.apiKey)).toHaveLength(1);
  });
});
