import fs from 'node:fs';
import { type AddressInfo } from 'node:net';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { SMTPServer } from 'smtp-server';
import { type Letter } from '../src/mail/letters.js';
import { MailService } from '../src/mail/mail.service.js';
import { RunningServer } from './running-server.js';

const RETURNED: Letter = {
  to: 'researcher@group.example',
  template: 'seriesReturned',
  values: {
    series: 'Ethanol in nitrogen, 283 to 448 K – räthselhaft λ',
    remark: 'Which vapour-pressure equation?\nThe points above 430 K need one.',
    by: 'E. Ditor <editor>',
    link: 'https://sheets.example/series/1?a=1&b=2',
  },
};

describe('mail without a mail server', () => {
  let server: RunningServer;
  let bearer: string;
  const enqueue = (letter: Letter & { dedupeKey?: string }) =>
    server.dataSource.transaction((manager) => server.app.get(MailService, { strict: false }).enqueue(manager, letter));
  const files = () => fs.readdirSync(path.join(server.dataDir, 'mail')).filter((name) => name.endsWith('.eml'));
  const list = async () =>
    (await server.http.get('/api/mail').set('Authorization', `Bearer ${bearer}`)).body as Record<string, string>[];

  beforeAll(async () => {
    server = await RunningServer.start();
    await server.addPerson('administrator@group.example', 'ADMINISTRATOR');
    bearer = (await server.signIn('administrator@group.example')).accessToken;
  });
  afterAll(() => server.stop());

  it('is captured whole, and an administrator reads it', async () => {
    await enqueue(RETURNED);
    const [entry] = await server.eventually(async () => ((await list()).length === 1 ? list() : undefined));

    expect(entry).toEqual({
      id: expect.stringMatching(/^\d{8}T\d{9}Z-[0-9a-f]{8}$/),
      to: 'researcher@group.example',
      subject: 'Returned to you: Ethanol in nitrogen, 283 to 448 K – räthselhaft λ',
      messageId: expect.stringMatching(/^<[0-9a-f-]{36}@localhost\.invalid>$/),
      sentAt: expect.any(String),
    });
    const answer = await server.http.get(`/api/mail/${entry!.id}`).set('Authorization', `Bearer ${bearer}`);
    expect(answer.headers['cache-control']).toBe('no-store');
    expect(answer.body.text).toContain('Which vapour-pressure equation?\nThe points above 430 K need one.');
    expect(answer.body.text).toContain('https://sheets.example/series/1?a=1&b=2');
    const source = fs.readFileSync(path.join(server.dataDir, 'mail', files()[0]!), 'utf8');
    expect(source).toMatch(/^Auto-Submitted: auto-generated\r$/m);
    expect(source).toMatch(/^Content-Type: multipart\/alternative;/m);
  });

  it('is addressed by the job, so that a job that runs twice sends one message twice, not two', async () => {
    const mail = server.app.get(MailService, { strict: false });
    const before = (await list()).length;
    await mail.deliver(RETURNED, '11111111-1111-4111-8111-111111111111');
    await mail.deliver(RETURNED, '11111111-1111-4111-8111-111111111111');

    const ids = (await list()).slice(0, 2).map(({ messageId }) => messageId);
    expect((await list()).length).toBe(before + 2);
    expect(new Set(ids)).toEqual(new Set(['<11111111-1111-4111-8111-111111111111@localhost.invalid>']));
  });

  it('goes out once for one key', async () => {
    const letter = { ...RETURNED, to: 'once@group.example', dedupeKey: 'series 1, event 7' };
    await enqueue(letter);
    await enqueue(letter);

    const [row] = await server.sql<{ n: number }>(
      `SELECT count(*)::int AS n FROM pgboss.job WHERE name = 'mail.send' AND data ->> 'to' = 'once@group.example'`,
    );
    expect(row!.n).toBe(1);
  });

  it.each([
    'researcher@group.example\r\nBcc: everybody@elsewhere.example',
    'researcher@group.example\nSubject: other',
    'a@group.example, b@group.example',
    'Somebody <a@group.example>',
    'no address',
    '',
  ])('is refused for the address %j', async (to) => {
    const before = files().length;
    await expect(enqueue({ ...RETURNED, to })).rejects.toThrow('one address');
    expect(files().length).toBe(before);
  });

  it('keeps a title with line breaks on the one line of the subject', async () => {
    const values = { ...RETURNED.values, series: 'Title\r\nBcc: everybody@elsewhere.example\r\n\r\nBody' };
    await enqueue({ to: 'injected@group.example', template: 'seriesReturned', values });
    const entry = await server.eventually(async () => (await list()).find(({ to }) => to === 'injected@group.example'));

    const source = fs.readFileSync(path.join(server.dataDir, 'mail', `${entry.id}.eml`), 'utf8');
    expect(source.split('\r\n\r\n')[0]).not.toMatch(/^bcc:/im);
    expect(entry.subject).toBe('Returned to you: Title Bcc: everybody@elsewhere.example Body');
  });

  it.each(['../../etc/passwd', '..%2f..%2fetc%2fpasswd', '20260101T000000000Z-00000000', 'x'])(
    'has no message %s',
    async (id) => {
      const answer = await server.http.get(`/api/mail/${id}`).set('Authorization', `Bearer ${bearer}`);
      expect(answer.status).toBe(404);
    },
  );
});

describe('mail with a mail server', () => {
  it('waits out a server that refuses, and is not shown here', async () => {
    let refusals = 2;
    const received: string[] = [];
    const smtp = new SMTPServer({
      disabledCommands: ['AUTH', 'STARTTLS'],
      onRcptTo: (_address, _session, done) => {
        refusals -= 1;
        done(refusals >= 0 ? new Error('come back later') : null);
      },
      onData: (stream, _session, done) => {
        stream.on('data', (chunk: Buffer) => received.push(chunk.toString()));
        stream.on('end', () => done());
      },
    });
    await new Promise<void>((resolve) => smtp.listen(0, '127.0.0.1', resolve));
    const { port } = smtp.server.address() as AddressInfo;
    const server = await RunningServer.start({ SMTP_URL: `smtp://127.0.0.1:${port}` });
    try {
      await server.addPerson('administrator@group.example', 'ADMINISTRATOR');
      const { accessToken } = await server.signIn('administrator@group.example');
      await server.dataSource.transaction((manager) =>
        server.app.get(MailService, { strict: false }).enqueue(manager, RETURNED),
      );
      const retried = () =>
        server.eventually(async () => {
          const rows = await server.sql<{ id: string }>(`SELECT id FROM pgboss.job WHERE state = 'retry'`);
          return rows.length > 0 ? rows : undefined;
        });
      for (let i = 0; i < 2; i += 1) {
        await retried();
        expect(received).toEqual([]);
        await server.sql(`UPDATE pgboss.job SET start_after = now() WHERE state = 'retry'`);
        await new Promise((resolve) => setTimeout(resolve, 700));
      }

      await server.eventually(() => Promise.resolve(received.length > 0 ? true : undefined));
      expect(received.join('')).toContain('To: researcher@group.example');
      const shown = await server.http.get('/api/mail').set('Authorization', `Bearer ${accessToken}`);
      expect(shown.status).toBe(404);
    } finally {
      await server.stop();
      await new Promise<void>((resolve) => smtp.close(resolve));
    }
  });
});
