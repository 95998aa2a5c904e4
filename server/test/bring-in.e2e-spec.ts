import { createHash, randomUUID } from 'node:crypto';
import http from 'node:http';
import { type AddressInfo } from 'node:net';
import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import ExcelJS from 'exceljs';
import { archiveOf, sheetOf, workbookParts } from './builders/archive.js';
import { RunningServer } from './running-server.js';

const HEADER = 'T / °C;p / kPa;D / cm²/s\n';
const GOOD = `${HEADER}25,0;101,3;0,1249\n30,1;101,3;0,1279\n35,0;101,2;0,1325\n40,0;101,1;0,1369\n45,1;101,4;0,1393\n`;

describe('bringing a table in', () => {
  let server: RunningServer;
  let researcher: string;
  let other: string;

  beforeAll(async () => {
    server = await RunningServer.start();
    for (const [email, role] of [
      ['researcher@example.org', 'RESEARCHER'],
      ['other@example.org', 'RESEARCHER'],
      ['modeller@example.org', 'MODELLER'],
    ] as const) {
      await server.addPerson(email, role);
    }
    researcher = (await server.signIn('researcher@example.org')).accessToken;
    other = (await server.signIn('other@example.org')).accessToken;
    await addSubstances(server);
  });
  afterAll(() => server.stop());

  const upload = (bytes: Buffer, name = 'table.csv', token = researcher) =>
    server.http.post('/api/files').set('Authorization', `Bearer ${token}`).attach('file', bytes, name);
  const read = (body: object, token = researcher) =>
    server.http.post('/api/bring-in/read').set('Authorization', `Bearer ${token}`).send(body);
  const keep = (body: object, token = researcher) =>
    server.http
      .post('/api/bring-in/keep')
      .set('Authorization', `Bearer ${token}`)
      .send({
        a: { name: 'ethanol' },
        b: { name: 'nitrogen' },
        title: 'Tubes 2019',
        source: 'notebook 7',
        method: 'evaporation tube',
        ...body,
      });
  const counts = async () => {
    const [row] = await server.sql<{ series: number; points: number; files: number; pairs: number }>(
      `SELECT (SELECT count(*)::int FROM series) series, (SELECT count(*)::int FROM series_points) points,
              (SELECT count(*)::int FROM files) files, (SELECT count(*)::int FROM gas_pairs) pairs`,
    );
    return row!;
  };

  describe('an upload', () => {
    it('is kept unchanged, with its SHA-256, and comes back byte for byte', async () => {
      const bytes = Buffer.from(GOOD, 'latin1');
      const { status, body } = await upload(bytes, 'Röhren 2019.csv');

      expect(status).toBe(201);
      expect(body).toEqual({
        id: expect.any(String),
        name: 'Röhren 2019.csv',
        size: bytes.length,
        sha256: createHash('sha256').update(bytes).digest('hex'),
      });
      const download = await server.http
        .get(`/api/files/${body.id}`)
        .set('Authorization', `Bearer ${researcher}`)
        .buffer(true)
        .parse((response, done) => {
          const chunks: Buffer[] = [];
          response.on('data', (chunk: Buffer) => chunks.push(chunk));
          response.on('end', () => done(null, Buffer.concat(chunks)));
        });
      expect(download.body).toEqual(bytes);
      expect(download.headers['content-disposition']).toBe(
        `attachment; filename="R_hren 2019.csv"; filename*=UTF-8''R%C3%B6hren%202019.csv`,
      );
      expect(download.headers['x-content-type-options']).toBe('nosniff');
    });

    it('is named without path, control and direction characters', async () => {
      const { body } = await upload(Buffer.from(GOOD), '..\\..\\a\u202egnp.csv');

      expect(body.name).toBe('agnp.csv');
    });

    it.each([
      ['a program named .csv', Buffer.from('7f454c46020101000000000000000000', 'hex'), 415],
      ['a picture named .csv', Buffer.from('89504e470d0a1a0a0000000d49484452', 'hex'), 415],
      ['an archive that is no workbook', archiveOf([{ name: 'a.txt', content: 'a' }]), 415],
      ['an empty file', Buffer.alloc(0), 400],
      ['more than 20 MB', Buffer.alloc(20 * 1024 * 1024 + 1, 'a'), 413],
    ])('of %s is refused', async (_, bytes, status) => {
      const before = await counts();
      const answer = await upload(bytes);

      expect(answer.status).toBe(status);
      expect(answer.headers['content-type']).toContain('application/problem+json');
      expect(answer.body.detail).toEqual(expect.any(String));
      expect(await counts()).toEqual(before);
    });

    it('of 200 MB is refused with 413 before it is sent', async () => {
      const { status, sent } = await sendTwoHundredMegabytes(server, researcher);

      expect(status).toBe(413);
      expect(sent).toBeLessThan(40 * 1024 * 1024);
    });

    it('without the field, or by somebody who may not, is refused', async () => {
      const modeller = (await server.signIn('modeller@example.org')).accessToken;
      const wrong = server.http
        .post('/api/files')
        .set('Authorization', `Bearer ${researcher}`)
        .attach('table', Buffer.from(GOOD), 'a.csv');

      expect((await wrong).status).toBe(400);
      expect((await upload(Buffer.from(GOOD), 'a.csv', modeller)).status).toBe(403);
      expect((await server.http.post('/api/files').attach('file', Buffer.from(GOOD), 'a.csv')).status).toBe(401);
    });

    it('of somebody else is not there', async () => {
      const { body } = await upload(Buffer.from(GOOD));

      const download = await server.http.get(`/api/files/${body.id}`).set('Authorization', `Bearer ${other}`);
      expect(download.status).toBe(404);
      expect((await read({ fileId: body.id }, other)).status).toBe(404);
    });

    it('is one of a hundred a day at most', async () => {
      await server.addPerson('eager@example.org', 'RESEARCHER');
      const { accessToken, personId } = await server.signIn('eager@example.org');
      await server.sql(
        `INSERT INTO files (name, media_type, size_bytes, sha256, storage_key, uploaded_by_id)
         SELECT 'a', 'text/plain', 1, repeat('0', 64), n::text, $1 FROM generate_series(1, 100) n`,
        [personId],
      );

      expect((await upload(Buffer.from(GOOD), 'a.csv', accessToken)).status).toBe(429);
      await server.sql('DELETE FROM files WHERE uploaded_by_id = $1', [personId]);
    });
  });

  describe('reading', () => {
    it('tells columns, units, points and the estimate beside them', async () => {
      const { status, body } = await read({
        text: GOOD,
        a: { name: 'ethanol' },
        b: { casNumber: '7727-37-9' },
        method: 'evaporation tube',
      });

      expect(status).toBe(200);
      expect(body).toMatchObject({
        source: { origin: 'TEXT', encoding: 'utf-8', delimiter: ';', decimal: ',', rowCount: 5, columnCount: 3 },
        columns: [{ header: 'T / °C', reason: 'the header names the temperature; unit from the header' }, {}, {}],
        issues: [],
        openCount: 0,
        pointCount: 5,
        temperature: { minimum: 298.15, maximum: 318.25 },
        assignedUncertainty: { relative: 0.02, pointCount: 5 },
        estimateLabel: 'Fuller–Schettler–Giddings',
        isComplete: true,
      });
      expect(body.rows[0]).toMatchObject({
        number: 2,
        cells: ['25,0', '101,3', '0,1249'],
        state: 'KEPT',
        point: { temperature: 298.15, pressure: 101_300, diffusivity: 1.249e-5 },
      });
      // The pair's estimate from the constants of its substances is within a few percent of what was measured.
      expect(body.rows[0].estimate / 1.249e-5).toBeGreaterThan(0.9);
      expect(body.rows[0].estimate / 1.249e-5).toBeLessThan(1.1);
    });

    it('takes a mapping and decisions, and checks again', async () => {
      const first = await read({
        text: 'T;p;D\n298,15;101,3;0,1249\n303,15;1013;0,1281\n308,15;101,3;0,1325\n313,15;101,3;0,1369\n',
      });
      expect(first.body.issueCounts).toEqual({ UNIT_GUESSED: 3, UNIT_OF_CELL: 1 });

      const { mapping } = first.body;
      for (const column of mapping.columns) column.unitOrigin = 'CHOSEN';
      const second = await read({
        text: 'T;p;D\n298,15;101,3;0,1249\n303,15;1013;0,1281\n308,15;101,3;0,1325\n313,15;101,3;0,1369\n',
        mapping,
        decisions: { 'UNIT_OF_CELL:3:1': 'READ_AS' },
      });
      expect(second.body).toMatchObject({ openCount: 0, isComplete: true });
      expect(second.body.rows[1].point.pressure).toBe(101_300);
    });

    it('shows the beginning of a long table, and every row about which something is asked', async () => {
      const rows = Array.from(
        { length: 2000 },
        (_, i) => `${300 + i / 10};101,325;${(0.127 * (1 + i / 3000) ** 1.75).toFixed(6)}`,
      );
      rows[1500] = 'broken;101,325;0,2';
      const { body } = await read({ text: `T/K;p/kPa;D/cm²/s\n${rows.join('\n').replaceAll('.', ',')}\n` });

      expect(body.source.rowCount).toBe(2000);
      expect(body.rows).toHaveLength(501);
      expect(body.rows.at(-1)).toMatchObject({ number: 1502, state: 'OPEN', point: null });
      expect(body.pointCount).toBe(1999);
    });

    it('changes nothing', async () => {
      const before = await counts();
      await read({ text: GOOD });

      expect(await counts()).toEqual(before);
    });

    it.each([
      [{}, 'give either fileId or text'],
      [{ text: GOOD, fileId: randomUUID() }, 'give either fileId or text'],
      [{ text: GOOD, delimiter: '|' }, 'delimiter'],
      [{ text: GOOD, mapping: { columns: 'all' } }, 'mapping'],
    ])('refuses a malformed request: %j', async (body, words) => {
      const answer = await read(body);

      expect(answer.status).toBe(400);
      expect(answer.body.detail).toContain(words);
    });
  });

  describe('keeping', () => {
    it('makes one draft with its points, and the original beside it', async () => {
      const { body: file } = await upload(Buffer.from(GOOD));
      const { status, body } = await keep({ fileId: file.id });

      expect(status).toBe(201);
      expect(body).toEqual({ seriesId: expect.any(String), pointCount: 5 });
      const [series] = await server.sql<Record<string, unknown>>('SELECT * FROM series WHERE id = $1', [body.seriesId]);
      expect(series).toMatchObject({ title: 'Tubes 2019', status: 'DRAFT', file_id: file.id });
      const points = await server.sql('SELECT * FROM series_points WHERE series_id = $1 ORDER BY index', [
        body.seriesId,
      ]);
      expect(points).toHaveLength(5);
      expect(points[0]).toMatchObject({
        temperature_k: 298.15,
        pressure_pa: 101_300,
        diffusivity_m2_s: 1.249e-5,
        uncertainty_origin: 'ASSIGNED',
      });
    });

    it('keeps a pasted text as a file, unchanged', async () => {
      const { body } = await keep({ text: GOOD });

      const [file] = await server.sql<{ sha256: string }>(
        'SELECT f.sha256 FROM files f JOIN series s ON s.file_id = f.id WHERE s.id = $1',
        [body.seriesId],
      );
      expect(file?.sha256).toBe(createHash('sha256').update(GOOD).digest('hex'));
    });

    it('takes a workbook with formulas once each is decided', async () => {
      const workbook = new ExcelJS.Workbook();
      const sheet = workbook.addWorksheet('runs');
      sheet.addRow(['T / K', 'p / kPa', 'D / cm²/s', 'u(D) / %']);
      sheet.addRow([298.15, 101.3, { formula: '0.5*0.2498', result: 0.1249 }, 1.5]);
      sheet.addRow([303.15, 101.3, 0.1281, 1.5]);
      const { body: file } = await upload(Buffer.from(await workbook.xlsx.writeBuffer()), 'runs.xlsx');

      const undecided = await keep({ fileId: file.id });
      expect(undecided.status).toBe(422);
      expect(undecided.body.problems).toEqual([
        {
          code: 'BAD_INPUT',
          message: expect.stringMatching(/^Not decided: .*formula, =0\.5\*0\.2498/),
          path: 'rows.2.columns.2',
        },
      ]);
      const decided = await keep({ fileId: file.id, decisions: { FORMULA: 'KEEP' } });
      expect(decided.body).toMatchObject({ pointCount: 2 });
      const points = await server.sql('SELECT * FROM series_points WHERE series_id = $1', [decided.body.seriesId]);
      expect(points[0]).toMatchObject({ uncertainty_origin: 'STATED' });
    });

    const swollen = sheetOf(`<row r="1"><c r="A1"><v>${' '.repeat(30 * 1024 * 1024)}</v></c></row>`);
    it.each<[string, string | Buffer, string | null, string]>([
      ['a wrong unit', 'T / °C;p / cm²/s;D / cm²/s\n25;101;0,12\n', 'columns.1', 'is a unit of diffusivity'],
      ['a missing column', 'T / °C;D / cm²/s\n25;0,12\n', null, 'No column holds the pressure'],
      ['text in a number', `${GOOD}fifty;101,3;0,15\n`, 'rows.7.columns.0', '“fifty” is not a number'],
      ['a zero T', `${GOOD}-273,15;101,3;0,15\n`, 'rows.7.columns.0', 'above absolute zero'],
      ['a negative P', `${GOOD}50;-101,3;0,15\n`, 'rows.7.columns.1', 'must be above zero'],
      ['a zero D', `${GOOD}50;101,3;0\n`, 'rows.7.columns.2', 'must be above zero'],
      ['a duplicate row', `${GOOD}45,1;101,4;0,1393\n`, 'rows.7', 'The same as row 6'],
      ['a header alone', HEADER, null, 'no data below it'],
      ['empty lines', '\n;;\n\n', 'file', 'nothing in it'],
      ['binary data', Buffer.concat([Buffer.from(GOOD.repeat(40)), Buffer.from([0, 1, 2])]), 'file', 'binary data'],
      ['a zip bomb', archiveOf(workbookParts(swollen)), 'file', 'unpacks to far more'],
      ['half a workbook', archiveOf(workbookParts(sheetOf(''))).subarray(0, -40), 'file', 'damaged'],
    ])('refuses %s at its place and stores nothing', async (_, table, path, words) => {
      const source =
        typeof table === 'string' ? { text: table } : { fileId: (await upload(table, 'table.csv')).body.id as string };
      const before = await counts();
      const { status, body } = await keep(source);

      expect(status).toBe(422);
      expect(body.problems).toHaveLength(1);
      expect(body.problems[0]).toMatchObject({ path, message: expect.stringContaining(words) });
      expect(await counts()).toEqual(before);
    });

    it('refuses what the series itself lacks, at its field', async () => {
      const before = await counts();
      const { status, body } = await keep({ text: GOOD, title: ' ', b: { name: 'phlogiston' } });

      expect(status).toBe(422);
      expect(body.problems.map(({ path }: { path: string }) => path)).toContain('title');
      expect(await counts()).toEqual(before);
    });

    it('takes replicates and, once decided, a row that is there twice', async () => {
      const { body } = await keep({
        text: `${GOOD}25,0;101,3;0,1262\n45,1;101,4;0,1393\n`,
        decisions: { DUPLICATE_ROW: 'KEEP' },
      });

      expect(body).toMatchObject({ pointCount: 7 });
    });

    it('does the same import once, and says how far it is', async () => {
      const importId = randomUUID();
      const first = await keep({ text: GOOD, importId });
      const before = await counts();
      const again = await keep({ text: GOOD, importId });

      expect(again.body).toEqual(first.body);
      expect(await counts()).toEqual(before);
      const progress = (token: string) =>
        server.http.get(`/api/bring-in/imports/${importId}`).set('Authorization', `Bearer ${token}`);
      expect((await progress(researcher)).body).toEqual({ phase: 'DONE', rows: 6, kept: first.body });
      expect((await progress(other)).status).toBe(404);
    });

    it('of 100,000 rows can be followed; cancelled in time it stores nothing', async () => {
      const rows = Array.from({ length: 100_000 }, (_, i) => {
        const t = 290 + i / 1000;
        return `${t.toFixed(3)},101325,${(0.126 * (t / 298.15) ** 1.75).toFixed(7)}`;
      });
      const { body: file } = await upload(Buffer.from(`T/K,p/Pa,D/cm2/s\n${rows.join('\n')}\n`));
      const before = await counts();
      const importId = randomUUID();
      const kept = keep({ fileId: file.id, importId }).then((answer) => answer);
      const at = (verb: 'get' | 'delete') =>
        server.http[verb](`/api/bring-in/imports/${importId}`).set('Authorization', `Bearer ${researcher}`);
      await server.eventually(async () => ((await at('get')).status === 200 ? true : undefined));
      expect((await at('delete')).body.phase).toBe('CANCELLED');

      expect((await kept).status).toBe(409);
      expect(await counts()).toEqual(before);

      const again = await keep({ fileId: file.id, importId: randomUUID() });
      expect(again.body).toMatchObject({ pointCount: 100_000 });
      expect((await counts()).points).toBe(before.points + 100_000);
    }, 120_000);
  });
});

/** Two substances with what the estimate needs: Fuller, Schettler & Giddings 1966, diffusion volumes; CIAAW molar masses. */
async function addSubstances(server: RunningServer): Promise<void> {
  for (const [name, formula, cas, molarMass, volume] of [
    ['ethanol', 'C2H6O', '64-17-5', 0.046068, 50.36],
    ['nitrogen', 'N2', '7727-37-9', 0.0280134, 17.9],
  ] as const) {
    const constants = [
      {
        kind: 'DIFFUSION_VOLUME',
        value: volume,
        unit: '1',
        form: null,
        coefficients: [],
        temperatureMinimum: null,
        temperatureMaximum: null,
        relativeUncertainty: null,
        source: 'Fuller, Schettler & Giddings 1966',
        note: null,
      },
    ];
    await server.sql(
      `INSERT INTO substances (name, formula, cas_number, molar_mass_kg_mol, constants)
       VALUES ($1, $2, $3, $4, $5) ON CONFLICT DO NOTHING`,
      [name, formula, cas, molarMass, JSON.stringify(constants)],
    );
  }
}

/** Announces 200 MB and sends until the server has answered. */
function sendTwoHundredMegabytes(server: RunningServer, token: string): Promise<{ status: number; sent: number }> {
  const { port } = server.app.getHttpServer().address() as AddressInfo;
  const head = '--x\r\ncontent-disposition: form-data; name="file"; filename="large.csv"\r\n\r\n';
  return new Promise((resolve, reject) => {
    let sent = 0;
    let answered = false;
    const request = http.request({
      port,
      host: '127.0.0.1',
      method: 'POST',
      path: '/api/files',
      headers: {
        authorization: `Bearer ${token}`,
        'content-type': 'multipart/form-data; boundary=x',
        'content-length': 200 * 1024 * 1024,
      },
    });
    request.on('response', (response) => {
      answered = true;
      response.resume();
      resolve({ status: response.statusCode ?? 0, sent });
      request.destroy();
    });
    request.on('error', (error) => !answered && reject(error));
    request.write(head);
    const chunk = Buffer.alloc(1024 * 1024, 'a');
    const send = (): void => {
      if (answered || sent >= 200 * 1024 * 1024 || request.destroyed) return;
      sent += chunk.length;
      request.write(chunk, () => setImmediate(send));
    };
    send();
  });
}
