import { createHash } from 'node:crypto';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import { FirstAdministratorService } from '../src/auth/first-administrator.service.js';
import { codeOf, cookieOf, PASSWORD, RunningServer, type SignedIn } from './running-server.js';

const NEW_PASSWORD = 'gravel-lantern-mosaic-82';
const INVITE = `mutation ($input: InvitePersonInput!) {
  invitePerson(input: $input) { person { id email accountStatus roles } problems { code path } }
}`;
const UPDATE = `mutation ($input: UpdatePersonInput!) {
  updatePerson(input: $input) { person { id accountStatus roles } problems { code message } }
}`;

describe('accounts', () => {
  let server: RunningServer;
  let administrator: SignedIn;

  const asAdministrator = (query: string, variables: object = {}) =>
    server.ask(query, variables, administrator.accessToken);
  const post = (path: string, body: object) => server.http.post(`/api/auth/${path}`).send(body);

  interface Mail {
    id: string;
    to: string;
    subject: string;
    text: string;
  }
  const mailbox = async (to: string): Promise<Mail[]> => {
    const list = await server.http.get('/api/mail').set('Authorization', `Bearer ${administrator.accessToken}`);
    return (list.body as Mail[]).filter((mail) => mail.to === to);
  };
  /** The secret of the newest letter to an address, once `count` have come. */
  const tokenMailedTo = async (to: string, count = 1): Promise<string> => {
    const [newest] = await server.eventually(async () => {
      const mails = await mailbox(to);
      return mails.length >= count ? mails : undefined;
    });
    const mail = await server.http
      .get(`/api/mail/${newest!.id}`)
      .set('Authorization', `Bearer ${administrator.accessToken}`);
    return /\/(?:invitation|reset-password)\/([\w-]+)/.exec((mail.body as Mail).text)![1]!;
  };

  beforeAll(async () => {
    server = await RunningServer.start({ PUBLIC_URL: 'https://sheets.example' });
    await server.addPerson('administrator@group.example', 'ADMINISTRATOR');
    administrator = await server.signIn('administrator@group.example');
  });
  afterAll(() => server.stop());
  beforeEach(() => server.sql('DELETE FROM throttles'));

  describe('by invitation', () => {
    it('begin with a letter, show who invites, and are signed in once accepted', async () => {
      const email = 'new@group.example';
      const invited = await asAdministrator(INVITE, { input: { email: 'New@Group.example', roles: ['RESEARCHER'] } });
      expect(invited.data!.invitePerson).toEqual({
        person: { id: expect.any(String), email, accountStatus: 'INVITED', roles: ['RESEARCHER'] },
        problems: [],
      });

      const token = await tokenMailedTo(email);
      const shown = await post('invitation', { token });
      expect(shown.status).toBe(200);
      expect(shown.body).toMatchObject({ email, roles: ['RESEARCHER'], invitedBy: 'administrator' });
      const days = (Date.parse(shown.body.expiresAt) - Date.now()) / 86_400_000;
      expect(days).toBeGreaterThan(6.9);
      expect(days).toBeLessThanOrEqual(7);

      const answer = await post('accept-invitation', { token, name: ' N. Ewcomer ', password: NEW_PASSWORD });
      expect(answer.status).toBe(200);
      expect(answer.body.person).toEqual({
        id: invited.data!.invitePerson.person.id,
        name: 'N. Ewcomer',
        roles: ['RESEARCHER'],
      });
      expect(cookieOf(answer, '__Host-diffolio-refresh')).toBeDefined();
      await server.signIn(email, NEW_PASSWORD);
    });

    it('work once', async () => {
      const email = 'once@group.example';
      await asAdministrator(INVITE, { input: { email, roles: ['MODELLER'] } });
      const token = await tokenMailedTo(email);
      expect((await post('accept-invitation', { token, name: 'First', password: NEW_PASSWORD })).status).toBe(200);

      const second = await post('accept-invitation', { token, name: 'Second', password: `${NEW_PASSWORD}!` });

      expect(second.status).toBe(410);
      expect(second.headers['content-type']).toMatch(/^application\/problem\+json/);
      expect((await post('invitation', { token })).status).toBe(410);
      await server.signIn(email, NEW_PASSWORD);
    });

    it('go to one of two who accept at once', async () => {
      const email = 'twice@group.example';
      await asAdministrator(INVITE, { input: { email, roles: ['MODELLER'] } });
      const token = await tokenMailedTo(email);

      const answers = await Promise.all([
        post('accept-invitation', { token, name: 'One', password: NEW_PASSWORD }),
        post('accept-invitation', { token, name: 'Two', password: NEW_PASSWORD }),
      ]);

      expect(answers.map(({ status }) => status).sort()).toEqual([200, 410]);
    });

    it('run out', async () => {
      const email = 'late@group.example';
      await asAdministrator(INVITE, { input: { email, roles: ['MODELLER'] } });
      const token = await tokenMailedTo(email);
      await server.sql('UPDATE account_tokens SET expires_at = now() WHERE used_at IS NULL');

      expect((await post('accept-invitation', { token, name: 'Late', password: NEW_PASSWORD })).status).toBe(410);
    });

    it('are replaced when sent again', async () => {
      const email = 'again@group.example';
      await asAdministrator(INVITE, { input: { email, roles: ['MODELLER'] } });
      const first = await tokenMailedTo(email);
      const again = await asAdministrator(INVITE, { input: { email, roles: ['EDITOR'] } });
      const second = await tokenMailedTo(email, 2);

      expect(again.data!.invitePerson.person.roles).toEqual(['EDITOR']);
      expect((await post('invitation', { token: first })).status).toBe(410);
      expect((await post('invitation', { token: second })).status).toBe(200);
    });

    it('ask for a name and a password that is not guessed first, and stay good until then', async () => {
      const email = 'picky@group.example';
      await asAdministrator(INVITE, { input: { email, roles: ['MODELLER'] } });
      const token = await tokenMailedTo(email);

      const answer = await post('accept-invitation', { token, name: ' ', password: 'password1234' });

      expect(answer.status).toBe(422);
      expect(answer.body.problems).toEqual([
        { code: 'BAD_INPUT', path: 'name', message: expect.any(String) },
        { code: 'BAD_INPUT', path: 'password', message: expect.stringMatching(/guessed first/) },
      ]);
      expect((await post('accept-invitation', { token, name: 'Picky', password: NEW_PASSWORD })).status).toBe(200);
    });

    it.each([
      ['no address', { email: 'nobody', roles: ['EDITOR'] }, 'BAD_INPUT', 'email'],
      ['two addresses', { email: 'a@group.example,b@group.example', roles: ['EDITOR'] }, 'BAD_INPUT', 'email'],
      [
        'a header in the address',
        { email: 'a@group.example\r\nBcc: b@group.example', roles: ['EDITOR'] },
        'BAD_INPUT',
        'email',
      ],
      ['no role', { email: 'roleless@group.example', roles: [] }, 'BAD_INPUT', 'roles'],
      ['somebody who is here', { email: 'administrator@group.example', roles: ['EDITOR'] }, 'DUPLICATE', 'email'],
    ])('refuse %s', async (_, input, code, path) => {
      const answer = await asAdministrator(INVITE, { input });
      expect(answer.data!.invitePerson).toEqual({ person: null, problems: [{ code, path }] });
    });

    it('are stored as hashes, in the job queue too', async () => {
      const email = 'hashed@group.example';
      await asAdministrator(INVITE, { input: { email, roles: ['MODELLER'] } });
      const token = await tokenMailedTo(email);

      expect(Buffer.from(token, 'base64url')).toHaveLength(32);
      const hashed = createHash('sha256').update(token).digest('hex');
      const [row] = await server.sql<{ stored: number; hashed: number; jobs: number }>(
        `SELECT (SELECT count(*) FROM account_tokens t WHERE t::text LIKE $1)::int AS stored,
                (SELECT count(*) FROM account_tokens WHERE token_hash = $2)::int AS hashed,
                (SELECT count(*) FROM pgboss.job j WHERE j::text LIKE $1)::int AS jobs`,
        [`%${token}%`, hashed],
      );
      expect(row).toEqual({ stored: 0, hashed: 1, jobs: 0 });
    });
  });

  describe('whose password is forgotten', () => {
    it('get a new one by mail, which ends all sessions', async () => {
      const email = 'forgetful@group.example';
      await server.addPerson(email, 'EDITOR');
      const before = await server.signIn(email);

      const asked = await post('request-password-reset', { email: ' Forgetful@group.example' });
      expect(asked.status).toBe(202);
      const token = await tokenMailedTo(email);
      const answer = await post('reset-password', { token, password: NEW_PASSWORD });

      expect(answer.status).toBe(204);
      expect(codeOf(await server.ask('{ me { id } }', {}, before.accessToken))).toBe('UNAUTHENTICATED');
      await server.signIn(email, NEW_PASSWORD);
      await expect(server.signIn(email, PASSWORD)).rejects.toThrow('401');
      expect((await post('reset-password', { token, password: `${NEW_PASSWORD}!` })).status).toBe(410);
    });

    it('are answered like addresses that nobody has, and only they get a letter', async () => {
      const email = 'asked@group.example';
      await server.addPerson(email, 'EDITOR');
      await asAdministrator(INVITE, { input: { email: 'pending@group.example', roles: ['EDITOR'] } });
      await tokenMailedTo('pending@group.example');

      const answers = [
        await post('request-password-reset', { email: 'stranger@elsewhere.example' }),
        await post('request-password-reset', { email: 'pending@group.example' }),
        await post('request-password-reset', { email }),
      ];

      for (const { status, text } of answers) expect({ status, text }).toEqual({ status: 202, text: '' });
      await tokenMailedTo(email);
      await server.eventually(async () => {
        const [row] = await server.sql<{ open: number }>(
          `SELECT count(*)::int AS open FROM pgboss.job WHERE name = 'account.letter' AND state <> 'completed'`,
        );
        return row!.open === 0 ? true : undefined;
      });
      expect(await mailbox('stranger@elsewhere.example')).toEqual([]);
      expect(await mailbox('pending@group.example')).toHaveLength(1);
    });

    it('get one letter a minute', async () => {
      const email = 'impatient@group.example';
      await server.addPerson(email, 'EDITOR');
      for (let i = 0; i < 3; i += 1) expect((await post('request-password-reset', { email })).status).toBe(202);

      // Two where a minute begins in between.
      const [jobs] = await server.sql<{ n: number }>(
        `SELECT count(*)::int AS n FROM pgboss.job WHERE name = 'account.letter' AND data ->> 'email' = $1`,
        [email],
      );
      expect(jobs!.n).toBeLessThanOrEqual(2);
    });

    it('have half an hour, and a token of an invitation is none of a reset', async () => {
      const email = 'slow@group.example';
      await server.addPerson(email, 'EDITOR');
      await post('request-password-reset', { email });
      const token = await tokenMailedTo(email);
      const [row] = await server.sql<{ minutes: number }>(
        `SELECT extract(epoch FROM expires_at - created_at)::float8 / 60 AS minutes FROM account_tokens
         WHERE token_hash = $1`,
        [createHash('sha256').update(token).digest('hex')],
      );
      expect(row!.minutes).toBe(30);
      expect((await post('accept-invitation', { token, name: 'Slow', password: NEW_PASSWORD })).status).toBe(410);

      await server.sql('UPDATE account_tokens SET expires_at = now() WHERE used_at IS NULL');
      expect((await post('reset-password', { token, password: NEW_PASSWORD })).status).toBe(410);
    });

    it('are not asked for without end from one address', async () => {
      await post('request-password-reset', { email: 'a@elsewhere.example' });
      await server.sql('UPDATE throttles SET failures = 25');
      await post('request-password-reset', { email: 'b@elsewhere.example' });

      const answer = await post('request-password-reset', { email: 'c@elsewhere.example' });

      expect(answer.status).toBe(429);
      expect(Number(answer.headers['retry-after'])).toBeGreaterThan(0);
    });
  });

  describe('whose owner changes the password', () => {
    it('keep the session that asks and lose the others', async () => {
      const email = 'tidy@group.example';
      await server.addPerson(email, 'EDITOR');
      const here = await server.signIn(email);
      const elsewhere = await server.signIn(email);
      const asHere = { Authorization: `Bearer ${here.accessToken}`, Cookie: here.refreshCookie };
      const change = (currentPassword: string, password: string) =>
        post('change-password', { currentPassword, password }).set(asHere);

      const wrong = await change('not my password', NEW_PASSWORD);
      expect(wrong.status).toBe(422);
      expect(wrong.body.problems).toMatchObject([{ code: 'WRONG_PASSWORD', path: 'currentPassword' }]);
      expect((await change(PASSWORD, 'tidy')).body.problems).toMatchObject([{ code: 'BAD_INPUT', path: 'password' }]);
      expect((await change(PASSWORD, NEW_PASSWORD)).status).toBe(204);

      expect(codeOf(await server.ask('{ me { id } }', {}, here.accessToken))).toBeUndefined();
      expect(codeOf(await server.ask('{ me { id } }', {}, elsewhere.accessToken))).toBe('UNAUTHENTICATED');
      await server.signIn(email, NEW_PASSWORD);
    });

    it('do not let somebody at an open screen guess', async () => {
      const email = 'away@group.example';
      await server.addPerson(email, 'EDITOR');
      const { accessToken } = await server.signIn(email);
      const guess = () =>
        post('change-password', { currentPassword: 'a guess', password: NEW_PASSWORD }).set(
          'Authorization',
          `Bearer ${accessToken}`,
        );
      await guess();
      await server.sql('UPDATE throttles SET failures = 10');
      await guess();

      const answer = await guess();

      expect(answer.status).toBe(429);
      expect(Number(answer.headers['retry-after'])).toBeGreaterThan(0);
    });
  });

  describe('in the hands of administrators', () => {
    it('change their roles at the next request', async () => {
      const id = await server.addPerson('promoted@group.example', 'RESEARCHER');
      const { accessToken } = await server.signIn('promoted@group.example');
      expect(codeOf(await server.ask('{ people { id } }', {}, accessToken))).toBe('FORBIDDEN');

      const answer = await asAdministrator(UPDATE, { input: { id, roles: ['EDITOR', 'ADMINISTRATOR'] } });

      expect(answer.data!.updatePerson.person.roles).toEqual(['EDITOR', 'ADMINISTRATOR']);
      expect(codeOf(await server.ask('{ people { id } }', {}, accessToken))).toBeUndefined();
      await asAdministrator(UPDATE, { input: { id, roles: ['EDITOR'] } });
      expect(codeOf(await server.ask('{ people { id } }', {}, accessToken))).toBe('FORBIDDEN');
    });

    it('are disabled at once, sessions included, and come back without them', async () => {
      const id = await server.addPerson('gone@group.example', 'RESEARCHER');
      const { accessToken } = await server.signIn('gone@group.example');

      const disabled = await asAdministrator(UPDATE, { input: { id, disabled: true } });
      expect(disabled.data!.updatePerson.person.accountStatus).toBe('DISABLED');
      expect(codeOf(await server.ask('{ me { id } }', {}, accessToken))).toBe('UNAUTHENTICATED');

      await asAdministrator(UPDATE, { input: { id, disabled: false } });
      expect(codeOf(await server.ask('{ me { id } }', {}, accessToken))).toBe('UNAUTHENTICATED');
      await server.signIn('gone@group.example');
    });

    it('leave one administrator, also when two demote each other at once', async () => {
      const other = await server.addPerson('second-administrator@group.example', 'ADMINISTRATOR');
      const { accessToken } = await server.signIn('second-administrator@group.example');
      const demote = (id: string, bearer: string) => server.ask(UPDATE, { input: { id, roles: ['EDITOR'] } }, bearer);

      const answers = await Promise.all([
        demote(other, administrator.accessToken),
        demote(administrator.personId, accessToken),
      ]);

      const changed = answers.filter(({ data }) => data?.updatePerson?.person);
      expect(changed).toHaveLength(1);
      const [row] = await server.sql<{ n: number }>(
        `SELECT count(*)::int AS n FROM people WHERE 'ADMINISTRATOR' = ANY (roles) AND disabled_at IS NULL`,
      );
      expect(row!.n).toBe(1);
      await server.sql(`UPDATE people SET roles = '{ADMINISTRATOR}' WHERE id = $1`, [administrator.personId]);
      await server.sql(`UPDATE people SET roles = '{EDITOR}' WHERE id = $1`, [other]);
    });

    it('refuse to disable the last administrator', async () => {
      const answer = await asAdministrator(UPDATE, { input: { id: administrator.personId, disabled: true } });
      expect(answer.data!.updatePerson).toMatchObject({ person: null, problems: [{ code: 'WRONG_STATE' }] });
    });

    it('are not found by an id of nobody', async () => {
      expect(codeOf(await asAdministrator(UPDATE, { input: { id: 'nobody', roles: ['EDITOR'] } }))).toBe('NOT_FOUND');
      expect(codeOf(await asAdministrator(UPDATE, { input: { id: crypto.randomUUID(), roles: ['EDITOR'] } }))).toBe(
        'NOT_FOUND',
      );
    });

    it.each(['MODELLER', 'RESEARCHER', 'EDITOR'] as const)('are closed to a %s', async (role) => {
      await server.addPerson(`${role.toLowerCase()}@group.example`, role);
      const { accessToken } = await server.signIn(`${role.toLowerCase()}@group.example`);
      for (const [query, variables] of [
        ['{ people { id } }', {}],
        [INVITE, { input: { email: 'friend@group.example', roles: ['ADMINISTRATOR'] } }],
        [UPDATE, { input: { id: administrator.personId, disabled: true } }],
        ['{ jobs { queues { queue } } }', {}],
      ] as const) {
        expect(codeOf(await server.ask(query, variables, accessToken))).toBe('FORBIDDEN');
        expect(codeOf(await server.ask(query, variables))).toBe('UNAUTHENTICATED');
      }
      const mail = await server.http.get('/api/mail').set('Authorization', `Bearer ${accessToken}`);
      expect(mail.status).toBe(403);
      expect((await server.http.get('/api/mail')).status).toBe(401);
    });
  });

  describe('as others see them', () => {
    it('show the address and state to administrators and the address to the person', async () => {
      await server.addPerson('private@group.example', 'RESEARCHER');
      const own = await server.signIn('private@group.example');
      const me = await server.ask('{ me { name email accountStatus lastSeenAt } }', {}, own.accessToken);
      expect(me.data!.me).toEqual({
        name: 'private',
        email: 'private@group.example',
        accountStatus: null,
        lastSeenAt: null,
      });

      const people = await asAdministrator('{ people { name email accountStatus lastSeenAt } }');
      expect(people.data!.people).toContainEqual({
        name: 'private',
        email: 'private@group.example',
        accountStatus: 'ACTIVE',
        lastSeenAt: expect.stringMatching(/^\d{4}-/),
      });
    });

    it('are nobody to a visitor', async () => {
      expect(await server.ask('{ me { id } }')).toEqual({ data: { me: null } });
    });
  });
});

describe('the first administrator', () => {
  let server: RunningServer;
  const firstAdministrator = () => server.app.get(FirstAdministratorService, { strict: false });
  const create = (token: string, person: object = {}) =>
    server.http
      .post('/api/auth/first-administrator')
      .send({ token, email: 'first@group.example', name: 'First', password: NEW_PASSWORD, ...person });

  beforeAll(async () => {
    server = await RunningServer.start();
  });
  afterAll(() => server.stop());

  it('comes by a link that the start prints, good once and only while there is nobody', async () => {
    expect((await create('no-link-was-printed')).status).toBe(410);

    const link = await firstAdministrator().link();
    expect(link).toMatch(new RegExp(`^${await server.app.getUrl()}/first-administrator/[\\w-]{43}$`));
    const token = link!.split('/').at(-1)!;

    expect((await create('a'.repeat(43))).status).toBe(410);
    expect((await create(token, { password: 'administrator' })).status).toBe(422);
    const answers = await Promise.all([create(token), create(token, { email: 'second@group.example' })]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 410]);
    expect(answers.find(({ status }) => status === 200)!.body.person.roles).toEqual(['ADMINISTRATOR']);

    expect((await create(token, { email: 'third@group.example' })).status).toBe(410);
    expect(await firstAdministrator().link()).toBeNull();
  });
});
