import { createHash } from 'node:crypto';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import { hash } from '@node-rs/argon2';
import { readEnv } from '../src/config/env.js';
import { cookieOf, PASSWORD, RunningServer, setCookies } from './running-server.js';

/** Enough that a hash not made would show in the time, little enough for a test. */
const HASH_MEMORY_KIB = 8 * 1024;

describe('signing in', () => {
  let server: RunningServer;
  const attempt = (email: string, password: string, headers: Record<string, string> = {}) =>
    server.http.post('/api/auth/sign-in').set(headers).send({ email, password });

  beforeAll(async () => {
    server = await RunningServer.start({ PASSWORD_MEMORY_KIB: String(HASH_MEMORY_KIB) });
    await server.addPerson('editor@group.example', 'EDITOR', 'RESEARCHER');
  });
  afterAll(() => server.stop());
  beforeEach(() => server.sql('DELETE FROM throttles'));

  it('answers a right pair with an access token, its life and the person', async () => {
    const answer = await attempt('editor@group.example', PASSWORD);

    expect(answer.status).toBe(200);
    expect(answer.headers['cache-control']).toBe('no-store');
    expect(answer.body).toEqual({
      accessToken: expect.any(String),
      expiresIn: 900,
      person: { id: expect.any(String), name: 'editor', roles: ['EDITOR', 'RESEARCHER'] },
    });
  });

  it('takes the e-mail without regard to case and blanks, the password exactly', async () => {
    expect((await attempt(' Editor@Group.EXAMPLE ', PASSWORD)).status).toBe(200);
    expect((await attempt('editor@group.example', PASSWORD.toUpperCase())).status).toBe(401);
    expect((await attempt('editor@group.example', `${PASSWORD} `)).status).toBe(401);
  });

  it('keeps the refresh token in a host-bound, secure, strict cookie that scripts cannot read', async () => {
    const cookies = setCookies(await attempt('editor@group.example', PASSWORD));

    expect(cookies.map((cookie) => cookie.split('=')[0])).toEqual([
      '__Host-diffolio-device',
      '__Host-diffolio-refresh',
    ]);
    for (const cookie of cookies) {
      expect(cookie).toMatch(/; Path=\/(;|$)/);
      expect(cookie).toMatch(/; HttpOnly(;|$)/);
      expect(cookie).toMatch(/; Secure(;|$)/);
      expect(cookie).toMatch(/; SameSite=Strict(;|$)/);
      expect(cookie).not.toMatch(/Domain=/i);
    }
  });

  it('refuses an unknown e-mail, a wrong password, an open invitation and a disabled account in the same words', async () => {
    await server.addPerson('disabled@group.example', 'EDITOR');
    await server.sql(`UPDATE people SET disabled_at = now() WHERE email = 'disabled@group.example'`);
    await server.sql(`INSERT INTO people (email, name, roles) VALUES ('invited@group.example', 'i', '{EDITOR}')`);
    const answers = [
      await attempt('editor@group.example', 'not-the-password'),
      await attempt('nobody@group.example', PASSWORD),
      await attempt('disabled@group.example', PASSWORD),
      await attempt('invited@group.example', PASSWORD),
    ];

    for (const { status, text, headers } of answers) {
      expect(status).toBe(401);
      expect(text).toBe(answers[0]!.text);
      expect(headers['content-type']).toMatch(/^application\/problem\+json/);
      expect(headers['set-cookie']).toBeUndefined();
    }
  });

  // CPU time of this process, server included, because the wall clock of a shared machine tells little. Whoever comes
  // first after a pause pays for fresh memory, so the two take turns at that.
  it('works as much for an unknown e-mail as for a wrong password', async () => {
    const costs = { known: 0, unknown: 0 };
    await attempt('editor@group.example', 'not-the-password');
    for (let i = 0; i < 10; i += 1) {
      await server.sql('DELETE FROM throttles');
      for (const kind of i % 2 === 0 ? (['known', 'unknown'] as const) : (['unknown', 'known'] as const)) {
        const before = process.cpuUsage();
        await attempt(kind === 'known' ? 'editor@group.example' : `nobody${i}@group.example`, 'not-the-password');
        costs[kind] += process.cpuUsage(before).user;
      }
    }

    expect(costs.unknown / costs.known).toBeGreaterThan(0.6);
    expect(costs.unknown / costs.known).toBeLessThan(1.67);
  });

  it.each([
    ['no body', undefined, 400],
    ['a body that is no object', '[]', 400],
    ['a missing password', '{"email":"editor@group.example"}', 400],
    ['a password that is no text', '{"email":"editor@group.example","password":{"$ne":1}}', 400],
    ['broken JSON', '{"email":', 400],
  ])('refuses %s', async (_, body, status) => {
    const answer = await server.http.post('/api/auth/sign-in').set('Content-Type', 'application/json').send(body);

    expect(answer.status).toBe(status);
    expect(answer.headers['content-type']).toMatch(/^application\/problem\+json/);
  });

  // OWASP ASVS 5.0.0, appendix C: argon2id with m ≥ 12 MiB at t ≥ 3.
  it('hashes with 64 MiB where no setting says otherwise', () => {
    expect(readEnv({ DATABASE_URL: 'postgres://nobody@127.0.0.1/none' }).PASSWORD_MEMORY_KIB).toBe(64 * 1024);
  });

  it('hashes again with the present parameters a password that an older setting hashed', async () => {
    const older = await hash(PASSWORD, { memoryCost: 19_456, timeCost: 2, parallelism: 1 });
    await server.addPerson('longstanding@group.example', 'RESEARCHER');
    await server.sql(`UPDATE people SET password_hash = $1 WHERE email = 'longstanding@group.example'`, [older]);

    await server.signIn('longstanding@group.example');

    const rows = await server.sql<{ password_hash: string }>(
      'SELECT password_hash FROM people WHERE password_hash <> $1',
      [''],
    );
    for (const { password_hash } of rows)
      expect(password_hash).toContain(`$argon2id$v=19$m=${HASH_MEMORY_KIB},t=3,p=1$`);
    await server.signIn('longstanding@group.example');
  });

  describe('slows guessing down', () => {
    /** Fails once, then has the counters say that it was so often. */
    const failOften = async (email: string, times: number, headers: Record<string, string> = {}) => {
      expect((await attempt(email, 'wrong', headers)).status).toBe(401);
      await server.sql('UPDATE throttles SET failures = $1', [times]);
    };

    it('after the fifth failure, with the time to wait, even for the right password', async () => {
      await failOften('editor@group.example', 9);
      expect((await attempt('editor@group.example', 'wrong')).status).toBe(401);

      const answer = await attempt('editor@group.example', PASSWORD);

      expect(answer.status).toBe(429);
      expect(Number(answer.headers['retry-after'])).toBeGreaterThan(20);
      expect(Number(answer.headers['retry-after'])).toBeLessThanOrEqual(32);
      expect(answer.body).toMatchObject({ status: 429, code: 'RATE_LIMITED' });
    });

    it('and forgets the failures once the right password comes', async () => {
      await failOften('editor@group.example', 4);
      expect((await attempt('editor@group.example', PASSWORD)).status).toBe(200);

      const pairs = await server.sql<{ failures: number }>(
        `SELECT failures FROM throttles WHERE key LIKE 'sign-in:%' ORDER BY failures`,
      );
      expect(pairs).toEqual([{ failures: 4 }]);
    });

    it('for unknown addresses in the same way', async () => {
      await failOften('nobody@group.example', 9);
      await attempt('nobody@group.example', 'wrong');

      expect((await attempt('nobody@group.example', 'wrong')).status).toBe(429);
    });

    it('whatever addresses the caller claims to come from', async () => {
      await failOften('editor@group.example', 9, { 'X-Forwarded-For': '203.0.113.1' });
      await attempt('editor@group.example', 'wrong', { 'X-Forwarded-For': '203.0.113.1' });

      const answer = await attempt('editor@group.example', 'wrong', {
        'X-Forwarded-For': '198.51.100.7',
        Forwarded: 'for=198.51.100.7',
        'X-Real-IP': '198.51.100.7',
      });

      expect(answer.status).toBe(429);
    });

    it('when many try at once: no more are looked at than one after the other', async () => {
      await failOften('editor@group.example', 9);
      const answers = await Promise.all(
        Array.from({ length: 40 }, (_, i) => attempt('editor@group.example', `wrong ${i}`)),
      );

      expect(answers.filter(({ status }) => status === 401)).toHaveLength(1);
      expect(answers.filter(({ status }) => status === 429)).toHaveLength(39);
    });

    it('from one address at many accounts, for a minute at most', async () => {
      await failOften('guess@group.example', 60);
      await attempt('another@group.example', 'wrong');

      const answer = await attempt('third@group.example', 'wrong');

      expect(answer.status).toBe(429);
      expect(Number(answer.headers['retry-after'])).toBeLessThanOrEqual(60);
    });

    it('at a hundred an hour for one account, but lets its owner in from a device that is known', async () => {
      const { deviceCookie } = await server.signIn('editor@group.example');
      await failOften('editor@group.example', 1);
      await server.sql('UPDATE throttles SET failures = 99 WHERE key = $1', [
        `sign-in:${createHash('sha256').update('editor@group.example').digest('hex')}`,
      ]);
      expect((await attempt('editor@group.example', 'wrong')).status).toBe(401);

      const stranger = await attempt('editor@group.example', PASSWORD);
      const owner = await attempt('editor@group.example', PASSWORD, { Cookie: deviceCookie });

      expect(stranger.status).toBe(429);
      expect(Number(stranger.headers['retry-after'])).toBeGreaterThan(3000);
      expect(owner.status).toBe(200);
    });

    it('on a known device too, and its mark serves for no other account', async () => {
      await server.addPerson('second@group.example', 'EDITOR');
      const { deviceCookie } = await server.signIn('editor@group.example');
      await server.sql('DELETE FROM throttles');
      await failOften('editor@group.example', 9, { Cookie: deviceCookie });
      await attempt('editor@group.example', 'wrong', { Cookie: deviceCookie });
      expect((await attempt('editor@group.example', PASSWORD, { Cookie: deviceCookie })).status).toBe(429);
      expect((await attempt('editor@group.example', PASSWORD)).status).toBe(200);

      await failOften('second@group.example', 9);
      await attempt('second@group.example', 'wrong');
      expect((await attempt('second@group.example', PASSWORD, { Cookie: deviceCookie })).status).toBe(429);
    });

    it('and writes down neither addresses that were tried nor passwords', async () => {
      await attempt('secret-in-the-wrong-field', 'wrong');

      const rows = await server.sql<{ key: string }>('SELECT key FROM throttles');
      expect(rows.length).toBeGreaterThan(0);
      expect(JSON.stringify(rows)).not.toContain('secret');
    });
  });

  describe('refuses requests of other sites', () => {
    it.each([
      ['an Origin elsewhere', { Origin: 'https://evil.example' }],
      ['the opaque Origin', { Origin: 'null' }],
      ['Sec-Fetch-Site: cross-site', { 'Sec-Fetch-Site': 'cross-site' }],
      ['Sec-Fetch-Site: same-site', { 'Sec-Fetch-Site': 'same-site' }],
    ])('by %s', async (_, headers) => {
      const { refreshCookie } = await server.signIn('editor@group.example');

      for (const path of ['sign-in', 'refresh', 'sign-out']) {
        const answer = await server.http.post(`/api/auth/${path}`).set({ ...headers, Cookie: refreshCookie });
        expect(answer.status).toBe(403);
      }
      const still = await server.http.post('/api/auth/refresh').set('Cookie', refreshCookie);
      expect(still.status).toBe(200);
    });

    it('but not those of its own pages', async () => {
      const url = new URL(await server.app.getUrl());
      const answer = await attempt('editor@group.example', PASSWORD, {
        Host: url.host,
        Origin: url.origin,
        'Sec-Fetch-Site': 'same-origin',
      });
      expect(answer.status).toBe(200);
    });

    it('by forms, which cannot send JSON', async () => {
      const answer = await server.http
        .post('/api/auth/sign-in')
        .set('Content-Type', 'text/plain')
        .send(JSON.stringify({ email: 'editor@group.example', password: PASSWORD }));
      expect(answer.status).toBeGreaterThanOrEqual(400);
      expect(cookieOf(answer, '__Host-diffolio-refresh')).toBeUndefined();
    });
  });
});
