import { type ChildProcess, fork } from 'node:child_process';
import net from 'node:net';
import os from 'node:os';
import fs from 'node:fs/promises';
import path from 'node:path';
import { type BenchRow } from '../bench-row.js';
import { median } from '../median.js';
import { type Burst, burst, type Question } from './load.js';

const ROUNDS = 7;
const BURST_MS = 1_000;
const WARM_UP_MS = 1_500;
const STATES = 10_000;
/** Both sides of a gate are measured on a shared machine. */
const TOLERANCE = 1.25;

const SHEET_QUERY = `query Sheet($code: String!) { dataSheet(code: $code) { code pair { substances { name formula } }
  current { number status summary releasedAt contentHash correlation { form expression referenceTemperature
  referencePressure parameters { symbol value standardUncertainty unit } covariance } } } }`;
const EVALUATION_QUERY = `query Evaluate($code: String!, $T: FloatColumn!, $P: FloatColumn!) { dataSheet(code: $code) { current {
  correlation { evaluate(temperatures: $T, pressures: $P) { diffusivities standardUncertainties expandedUncertainties outside } } } } }`;

function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const server = net.createServer().once('error', reject);
    server.listen(0, '127.0.0.1', () => {
      const { port } = server.address() as net.AddressInfo;
      server.close(() => resolve(port));
    });
  });
}

function start(file: string, env: Record<string, string>): Promise<ChildProcess> {
  return new Promise((resolve, reject) => {
    const child = fork(file, { env: { ...process.env, ...env }, stdio: ['ignore', 'ignore', 'inherit', 'ipc'] });
    child.once('message', () => resolve(child));
    child.once('exit', (code) => reject(new Error(`${file} ended with ${code}`)));
  });
}

function graphqlQuestion(base: string, query: string, variables: object): Question {
  const body = JSON.stringify({ query, variables });
  const headers = { 'content-type': 'application/json', 'content-length': String(Buffer.byteLength(body)) };
  return { url: `${base}/graphql`, method: 'POST', headers, body, expectedStatus: 200 };
}

async function answerTo({ url, method, headers, body }: Question): Promise<string> {
  const response = await fetch(url, { method, headers, ...(body !== undefined && { body }) });
  return response.text();
}

/** Full-digit columns, as a simulation code would send them. */
function states(): { T: number[]; P: number[] } {
  return {
    T: Array.from({ length: STATES }, (_, i) => 285 + (160 * i) / STATES),
    P: Array.from({ length: STATES }, (_, i) => 90_000 + 20_000 * Math.abs(Math.sin(i))),
  };
}

/** CPU of writing and reading the columns alone, µs: what any JSON answer of these numbers costs. */
function jsonCost(answer: string): number {
  const { data } = JSON.parse(answer) as { data: { dataSheet: { current: { correlation: { evaluate: object } } } } };
  const columns = data.dataSheet.current.correlation.evaluate;
  const times = Array.from({ length: 30 }, () => {
    const begin = performance.now();
    JSON.stringify(columns);
    return (performance.now() - begin) * 1000;
  });
  return median(times);
}

interface Contender {
  pid: number;
  question: Question;
  bursts: Burst[];
}

/** Bursts in turns, so that the machine's mood strikes all alike. */
async function compete(contenders: Record<string, Contender>): Promise<void> {
  for (const { pid, question } of Object.values(contenders)) await burst(pid, question, WARM_UP_MS);
  for (let round = 0; round < ROUNDS; round += 1) {
    for (const contender of Object.values(contenders)) {
      contender.bursts.push(await burst(contender.pid, contender.question, BURST_MS));
    }
  }
}

const middle = ({ bursts }: Contender, figure: keyof Burst) => median(bursts.map((one) => one[figure]));

function row(name: string, contender: Contender): BenchRow {
  const value = `${Math.round(middle(contender, 'requestsPerSecond'))} requests/s, p50 ${middle(contender, 'p50').toFixed(1)} ms, p99 ${middle(contender, 'p99').toFixed(1)} ms, ${Math.round(middle(contender, 'cpuPerRequest'))} µs CPU`;
  return { name, value, gate: null, met: null };
}

function gated(name: string, ratio: number, limit: number, against: string): BenchRow {
  return {
    name,
    value: `${ratio.toFixed(2)} × ${against}`,
    gate: `≤ ${limit} × (±25 %)`,
    met: ratio <= limit * TOLERANCE,
  };
}

/**
 * A released sheet over GraphQL, its 304, and 10,000 states evaluated, beside raw `node:http` + `pg` and a bare answer.
 *
 * @param databaseUrl a PostgreSQL database of its own; the demo is seeded into it
 */
export async function benchApi(databaseUrl: string): Promise<BenchRow[]> {
  const data = await fs.mkdtemp(path.join(os.tmpdir(), 'diffolio-bench-'));
  const port = await freePort();
  const rawPort = await freePort();
  const base = `http://127.0.0.1:${port}`;
  const env = { DATABASE_URL: databaseUrl, NODE_ENV: 'production', LOG_LEVEL: 'error' };
  const dist = path.resolve(import.meta.dirname, '../..');
  const app = await start(`${dist}/src/main.js`, {
    ...env,
    PORT: String(port),
    DIFFOLIO_DATA_DIR: data,
    DIFFOLIO_DEMO: 'true',
  });
  const code = 'DS-0001';
  const sheet = graphqlQuestion(base, SHEET_QUERY, { code });
  const evaluation = graphqlQuestion(base, EVALUATION_QUERY, { code, ...states() });
  const evaluated = await answerTo(evaluation);
  const etag = (await fetch(`${base}/sheets/${code}/2.0.json`)).headers.get('etag') ?? '';
  const notModified: Question = {
    url: `${base}/sheets/${code}/2.0.json`,
    method: 'GET',
    headers: { 'if-none-match': etag },
    expectedStatus: 304,
  };
  const raw = await start(path.join(import.meta.dirname, 'raw-server.js'), {
    ...env,
    PORT: String(rawPort),
    BARE_BODY: await answerTo(sheet),
  });
  const get = (url: string): Question => ({ url, method: 'GET', headers: {}, expectedStatus: 200 });
  try {
    const contenders = {
      bare: { pid: raw.pid!, question: get(`http://127.0.0.1:${rawPort}/bare`), bursts: [] as Burst[] },
      raw: { pid: raw.pid!, question: get(`http://127.0.0.1:${rawPort}/sheet/${code}`), bursts: [] as Burst[] },
      sheet: { pid: app.pid!, question: sheet, bursts: [] as Burst[] },
      unchanged: { pid: app.pid!, question: notModified, bursts: [] as Burst[] },
      evaluation: { pid: app.pid!, question: evaluation, bursts: [] as Burst[] },
    };
    await compete(contenders);
    const rawCpu = middle(contenders.raw, 'cpuPerRequest');
    const json = jsonCost(evaluated);
    return [
      row('bare node:http answer of the same bytes', contenders.bare),
      row('raw node:http + pg, the same sheet by two prepared SELECTs', contenders.raw),
      row('one released sheet over GraphQL', contenders.sheet),
      gated('  CPU of it', middle(contenders.sheet, 'cpuPerRequest') / rawCpu, 1.9, 'raw'),
      row('the released JSON unchanged (304)', contenders.unchanged),
      gated('  CPU of it', middle(contenders.unchanged, 'cpuPerRequest') / rawCpu, 0.4, 'raw'),
      row(`${STATES} states evaluated over GraphQL`, contenders.evaluation),
      gated(
        '  CPU of it, request and all',
        middle(contenders.evaluation, 'cpuPerRequest') / json,
        2,
        `JSON.stringify of its columns (${Math.round(json)} µs)`,
      ),
    ];
  } finally {
    raw.removeAllListeners('exit').kill();
    app.removeAllListeners('exit').kill();
    await fs.rm(data, { recursive: true, force: true });
  }
}
