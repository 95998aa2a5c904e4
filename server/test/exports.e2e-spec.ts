import { createHash } from 'node:crypto';
import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { DEMO_PASSWORD, DemoSeeder } from '../seeds/demo/seed-demo.js';
import { seedLibrary } from '../seeds/seed-library.js';
import { readPdf } from './read-pdf.js';
import { RunningServer } from './running-server.js';

interface VersionRow {
  code: string;
  number: string;
  status: string;
  contentHash: string | null;
}

const VERSIONS = `SELECT d.code, v.edition || '.' || v.revision AS number, v.status, r.content_hash AS "contentHash"
  FROM data_sheet_versions v JOIN data_sheets d ON d.id = v.data_sheet_id LEFT JOIN releases r ON r.version_id = v.id`;
const DAY_ONE = /^@\d{10}$/;

describe('data sheets as files', () => {
  let server: RunningServer;
  let versions: VersionRow[];
  const pages = fs.mkdtempSync(path.join(os.tmpdir(), 'diffolio-pages-'));
  const oneThatIs = (status: string): VersionRow => versions.find((version) => version.status === status)!;
  const addressOf = ({ code, number }: VersionRow, extension = ''): string => `/sheets/${code}/${number}${extension}`;
  const bytes = (answer: { body: Buffer }): Buffer => answer.body;

  beforeAll(async () => {
    fs.writeFileSync(path.join(pages, 'index.html'), '<!doctype html><title>Diffolio</title>');
    server = await RunningServer.start({ DIFFOLIO_PAGES_DIR: pages });
    await seedLibrary(server.dataSource);
    await new DemoSeeder(server.app).seed();
    versions = await server.sql<VersionRow>(VERSIONS);
  }, 120_000);
  afterAll(async () => {
    await server.stop();
    fs.rmSync(pages, { recursive: true });
  });

  it('gives a released version as JSON, with its correlation in full and what the sheet says', async () => {
    const released = oneThatIs('RELEASED');
    const answer = await server.http.get(addressOf(released, '.json')).expect(200);

    expect(answer.headers).toMatchObject({
      'content-type': 'application/json; charset=utf-8',
      'cache-control': 'public, max-age=300, must-revalidate',
      vary: expect.stringContaining('Accept'),
      etag: expect.stringMatching(/^"[0-9a-f]{64}-json-released-/),
    });
    expect(answer.headers['deprecation']).toBeUndefined();
    expect(answer.body.standing).toMatchObject({ status: 'RELEASED', contentHash: released.contentHash });
    expect(answer.body.release).toBe(`/releases/${released.contentHash}.json`);
    expect(answer.body.correlation.parameters[0]).toMatchObject({ symbol: 'D0', unit: 'm2/s' });
    expect(answer.body.content.recommended.temperatures.length).toBeGreaterThan(2);
  });

  it('chooses by the Accept header, and says 406 with what it offers', async () => {
    const address = addressOf(oneThatIs('RELEASED'));
    const typeFor = async (accept: string) =>
      (await server.http.get(address).set('Accept', accept)).headers['content-type'];

    expect(await typeFor('text/csv')).toBe('text/csv; charset=utf-8');
    expect(await typeFor('application/pdf')).toBe('application/pdf');
    expect(await typeFor('text/csv;q=0.5, application/json')).toBe('application/json; charset=utf-8');
    expect(await typeFor('*/*')).toBe('application/json; charset=utf-8');
    const refused = await server.http.get(address).set('Accept', 'image/png').expect(406);
    expect(refused.headers['content-type']).toMatch('application/problem+json');
    expect(refused.body.offered).toContain('application/pdf');
    await server.http.get(`${address}.xml`).expect(406);
  });

  it('gives a browser the page, which is never kept, whatever the version', async () => {
    const browser = 'text/html,application/xhtml+xml,application/xml;q=0.9,*/*;q=0.8';
    const { code } = oneThatIs('RELEASED');
    for (const address of [
      addressOf(oneThatIs('RELEASED')),
      addressOf(oneThatIs('IN_REVIEW')),
      `/sheets/${code}/9.9`,
    ]) {
      const answer = await server.http.get(address).set('Accept', browser).expect(200);
      expect(answer.headers).toMatchObject({ 'cache-control': 'no-cache', vary: 'Accept' });
      expect(answer.text).toContain('<title>Diffolio</title>');
    }
    await server.http.get(`/sheets/${code}`).set('Accept', browser).expect(302);
    await server.http.get('/sheets/DS-9999').set('Accept', browser).expect(200);
    // An extension says what is wanted, whoever asks.
    const pdf = await server.http
      .get(addressOf(oneThatIs('RELEASED'), '.pdf'))
      .set('Accept', browser)
      .expect(200);
    expect(pdf.headers['content-type']).toBe('application/pdf');
  });

  it('gives a CSV that says first what its numbers are', async () => {
    const released = oneThatIs('RELEASED');
    const { text } = await server.http.get(addressOf(released, '.csv')).expect(200);
    expect(text.startsWith(`Data sheet,${released.code}\r\n`)).toBe(true);
    expect(text).toContain('temperature_k,pressure_pa,diffusivity_m2_s');
  });

  it('gives a PDF whose text holds the fitted numbers, the same bytes each time', async () => {
    const released = oneThatIs('RELEASED');
    const first = await server.http.get(addressOf(released, '.pdf')).expect(200);
    const archived = await server.http.get(`/releases/${released.contentHash}.pdf`).expect(200);
    const { body } = await server.http.get(addressOf(released, '.json'));

    expect(bytes(first).equals(bytes(archived))).toBe(true);
    const { text, fonts, imageCount } = readPdf(bytes(first));
    const [D0] = body.content.correlation.parameters;
    expect(text.replace(/\s/g, '')).toContain(D0.printed.replace(/\s/g, ''));
    expect(text).toContain(released.contentHash!.slice(0, 4));
    expect(fonts.every((font) => font.isEmbedded)).toBe(true);
    expect(imageCount).toBe(0);
  });

  it('prints on Letter when asked, under a validator of its own, and on no other paper', async () => {
    const address = addressOf(oneThatIs('RELEASED'), '.pdf');
    const a4 = await server.http.get(address);
    const letter = await server.http.get(`${address}?paper=letter`).expect(200);
    expect(letter.headers['etag']).not.toBe(a4.headers['etag']);
    expect(bytes(letter).toString('latin1')).toContain('[0 0 612 792]');
    expect(bytes(await server.http.get(`${address}?paper=letter`)).equals(bytes(letter))).toBe(true);
    await server.http.get(`${address}?paper=A3`).expect(400);
  });

  it('says in headers and in the document when a version is superseded, and by which', async () => {
    const superseded = oneThatIs('SUPERSEDED');
    const answer = await server.http.get(addressOf(superseded, '.json')).expect(200);
    const { supersededBy } = answer.body.standing;

    expect(answer.headers['deprecation']).toMatch(DAY_ONE);
    expect(answer.headers['link']).toBe(`</sheets/${superseded.code}/${supersededBy}>; rel="successor-version"`);
    expect(answer.headers['etag']).toMatch(/-json-superseded-/);
    const { text } = readPdf(bytes(await server.http.get(addressOf(superseded, '.pdf')).expect(200)));
    expect(text.replace(/\s+/g, ' ')).toContain(`Version ${supersededBy} has taken the place`);
  });

  it('says in headers and in the document when a version is withdrawn, and keeps its archived bytes', async () => {
    const withdrawn = oneThatIs('WITHDRAWN');
    const answer = await server.http.get(addressOf(withdrawn, '.csv')).expect(200);
    expect(answer.headers['deprecation']).toMatch(DAY_ONE);
    expect(answer.text).toContain('Do not use its numbers');
    await server.http.get(`/releases/${withdrawn.contentHash}.json`).expect(200);
  });

  it('says so at once when a version that was just read is withdrawn', async () => {
    const { code, number } = versions.filter((version) => version.status === 'RELEASED').at(-1)!;
    const address = `/sheets/${code}/${number}.json`;
    expect((await server.http.get(address)).headers['deprecation']).toBeUndefined();
    const { accessToken } = await server.signIn('editor2@demo.example', DEMO_PASSWORD);
    const { data } = await server.ask(
      'query ($code: String!, $number: String!) { dataSheet(code: $code) { version(number: $number) { id } } }',
      { code, number },
    );
    await server.ask(
      `mutation ($id: ID!, $password: String!) {
        withdrawDataSheet(versionId: $id, reason: "A bath was misread", password: $password) { problems { code } } }`,
      { id: data!['dataSheet'].version.id, password: DEMO_PASSWORD },
      accessToken,
    );
    const answer = await server.http.get(address).expect(200);
    expect(answer.headers['deprecation']).toMatch(DAY_ONE);
    expect(answer.body.standing).toMatchObject({ status: 'WITHDRAWN', withdrawalReason: 'A bath was misread' });
    await server.http.get(`/sheets/${code}`).expect(404);
  });

  it('leads to the current version, and nowhere where there is none', async () => {
    const { code, number } = oneThatIs('RELEASED');
    const answer = await server.http.get(`/sheets/${code}`).expect(302);
    expect(answer.headers['location']).toBe(`/sheets/${code}/${number}`);
    expect(answer.headers['link']).toBe(`</sheets/${code}/${number}>; rel="latest-version"`);
    await server.http.get('/sheets/DS-9999').expect(404);
    await server.http.get('/sheets/DS-9999/1.0.json').expect(404);
    await server.http.get(`/sheets/${code}/99.0.json`).expect(404);
  });

  it('hides unreleased versions from visitors, and shows them to the group uncached and marked', async () => {
    const open = oneThatIs('IN_REVIEW');
    await server.http.get(addressOf(open, '.pdf')).expect(404);
    const { accessToken } = await server.signIn('editor@demo.example', DEMO_PASSWORD);
    const answer = await server.http
      .get(addressOf(open, '.pdf'))
      .set('Authorization', `Bearer ${accessToken}`)
      .expect(200);
    expect(answer.headers['cache-control']).toBe('private, no-store');
    expect(answer.headers['etag']).toBeUndefined();
    expect(
      readPdf(bytes(answer))
        .text.split('\n')
        .map((line) => line.trim()),
    ).toContain('in review');
  });

  it('keeps the archived bytes of every release, named by their hash', async () => {
    for (const { contentHash } of versions.filter((version) => version.contentHash !== null)) {
      const answer = await server.http.get(`/releases/${contentHash}.json`).expect(200);
      expect(createHash('sha256').update(answer.text, 'utf8').digest('hex')).toBe(contentHash);
      expect(answer.headers['cache-control']).toBe('public, max-age=31536000, immutable');
    }
    await server.http.get(`/releases/${'0'.repeat(64)}.json`).expect(404);
    await server.http.get('/releases/latest.json').expect(404);
  });

  describe('asked again with a validator', () => {
    it('answers 304 without a body, for one form and no other', async () => {
      const address = addressOf(oneThatIs('RELEASED'));
      const { headers } = await server.http.get(`${address}.json`);
      const again = await server.http.get(`${address}.json`).set('If-None-Match', headers['etag']!).expect(304);
      expect(again.text).toBe('');
      expect(again.headers).toMatchObject({
        etag: headers['etag'],
        'cache-control': 'public, max-age=300, must-revalidate',
        vary: 'Accept',
        'x-content-type-options': 'nosniff',
      });
      await server.http.get(`${address}.csv`).set('If-None-Match', headers['etag']!).expect(200);
      await server.http.get(address).set('Accept', 'text/csv').set('If-None-Match', headers['etag']!).expect(200);
    });

    it('answers 304 for archived bytes from the address alone', async () => {
      const { contentHash } = oneThatIs('WITHDRAWN');
      const tag = `"${contentHash}-json"`;
      await server.http.get(`/releases/${contentHash}.json`).set('If-None-Match', `W/"x", ${tag}`).expect(304);
    });

    it('never answers 304 before authorisation to a request that says who it is', async () => {
      const address = addressOf(oneThatIs('RELEASED'), '.json');
      const { headers } = await server.http.get(address);
      await server.http
        .get(address)
        .set('If-None-Match', headers['etag']!)
        .set('Authorization', 'Bearer not-a-token')
        .expect(401);
    });
  });

  describe('evaluated over HTTP', () => {
    const states = { temperatures: [298.15, 320, 9000], pressures: [101_325] };
    const evaluateAt = (body: object, accept = 'application/json') =>
      server.http
        .post(`${addressOf(oneThatIs('RELEASED'))}/evaluate`)
        .set('Accept', accept)
        .send(body);

    it('gives columns with all digits, those of GraphQL', async () => {
      const { code, number } = oneThatIs('RELEASED');
      const answer = await evaluateAt(states).expect(200);
      const { data } = await server.ask(
        `query ($code: String!, $number: String!, $t: FloatColumn!, $p: FloatColumn!) {
          dataSheet(code: $code) { version(number: $number) { correlation { evaluate(temperatures: $t, pressures: $p) {
            diffusivities standardUncertainties expandedUncertainties coverageFactor outside } } } } }`,
        { code, number, t: states.temperatures, p: states.pressures },
      );
      expect(answer.body).toMatchObject(data!['dataSheet'].version.correlation.evaluate);
      expect(answer.body).toMatchObject({ sheet: code, number, status: 'RELEASED', outside: [2] });
    });

    it('gives CSV and JSON lines with the units named and the outside flagged', async () => {
      const csv = await evaluateAt(states, 'text/csv').expect(200);
      const [head, first, , third] = csv.text.split('\r\n');
      expect(head).toMatch(/^temperature_k,pressure_pa,diffusivity_m2_s,/);
      expect(first).toMatch(/^298\.15,101325,.*,false$/);
      expect(third).toMatch(/^9000,101325,.*,true$/);
      const lines = (await evaluateAt(states, 'application/x-ndjson').buffer(true).expect(200)).text.trim().split('\n');
      expect(JSON.parse(lines[1]!)).toMatchObject({ temperature: 320, isOutsideRange: false });
    });

    it('refuses what it cannot evaluate, with the reason', async () => {
      const problemOf = async (body: object) => (await evaluateAt(body)).body;
      expect(await problemOf({ ...states, temperatures: [] })).toMatchObject({ status: 400, code: 'BAD_USER_INPUT' });
      expect(await problemOf({ ...states, temperatures: ['300'] })).toMatchObject({ status: 400 });
      expect(await problemOf({ ...states, pressures: [-1] })).toMatchObject({ status: 400 });
      expect(await problemOf({ ...states, pressures: [1e5, 1e5] })).toMatchObject({ status: 400 });
      expect(await problemOf({ ...states, unit: 'bar' })).toMatchObject({ status: 400 });
      expect(await problemOf({ ...states, outsideRange: 'REFUSE' })).toMatchObject({
        status: 422,
        code: 'OUT_OF_RANGE',
      });
      expect(await problemOf({ temperatures: Array(10_001).fill(300), pressures: [1e5] })).toMatchObject({
        status: 400,
      });
    });

    it('is open to an API key, which reads', async () => {
      const { accessToken } = await server.signIn('modeller@demo.example', DEMO_PASSWORD);
      const { data } = await server.ask('mutation { createApiKey(name: "reactor model") { secret } }', {}, accessToken);
      await evaluateAt(states).set('Authorization', `Bearer ${data!['createApiKey'].secret}`).expect(200);
    });

    it('takes 10,000 states at once', async () => {
      const temperatures = Array.from({ length: 10_000 }, (_, i) => 290 + i / 1000);
      const answer = await evaluateAt({ temperatures, pressures: [101_325] }).expect(200);
      expect(answer.body.diffusivities).toHaveLength(10_000);
    });
  });
});
