import http from 'node:http';
import pg from 'pg';

/**
 * What the figures of the API are held against, in a process of its own: a bare `node:http` answer of fixed bytes at
 * `/bare`, and `node:http` with two prepared SELECTs for the same sheet at `/sheet`.
 */
const pool = new pg.Pool({ connectionString: process.env['DATABASE_URL'], max: 10 });
const bare = Buffer.from(process.env['BARE_BODY'] ?? '');

const SHEET = `SELECT d.code, d.pair_id, v.edition, v.revision, v.status, v.summary, v.fit_id, r.content_hash, r.released_at
  FROM data_sheets d JOIN data_sheet_versions v ON v.data_sheet_id = d.id AND v.status = 'RELEASED'
  JOIN releases r ON r.version_id = v.id WHERE d.code = $1`;
const CORRELATION = `SELECT result -> 'parameters' AS parameters, result -> 'covariance' AS covariance FROM fits WHERE id = $1`;

interface SheetRow {
  fit_id: string;
}

async function sheet(code: string): Promise<string> {
  const { rows } = await pool.query<SheetRow>({ name: 'sheet', text: SHEET, values: [code] });
  const correlation = await pool.query<object>({ name: 'correlation', text: CORRELATION, values: [rows[0]!.fit_id] });
  return JSON.stringify({ data: { dataSheet: rows[0], correlation: correlation.rows[0] } });
}

const server = http.createServer((request, response) => {
  const answer = (body: string | Buffer) => {
    response.writeHead(200, { 'content-type': 'application/json', 'content-length': Buffer.byteLength(body) });
    response.end(body);
  };
  if (request.url === '/bare') answer(bare);
  else void sheet(request.url?.slice('/sheet/'.length) ?? '').then(answer);
});
server.listen(Number(process.env['PORT']), '127.0.0.1', () => process.send?.({ ready: true }));
