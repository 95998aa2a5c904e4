import { randomUUID } from 'node:crypto';
import fs from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { type INestApplication } from '@nestjs/common';
import pg from 'pg';
import { from as copyFrom } from 'pg-copy-streams';
import { createApp } from '../src/app.js';
import { recognise } from '../src/bring-in/recognise.js';
import { readText } from '../src/bring-in/text/read-text.js';
import { type UnderstoodPoint } from '../src/bring-in/points.js';
import { understand } from '../src/bring-in/understand.js';
import { readEnv } from '../src/config/env.js';
import { migrate } from '../src/database/migrate.js';
import { PressureOrigin } from '../src/series/series.entity.js';
import { SeriesService } from '../src/series/series.service.js';
import { type BenchRow } from './bench-row.js';
import { median } from './median.js';

const POINTS = 100_000;
const ROUNDS = 5;
const MOST_MS = 2_000;
const MOST_TIMES_COPY = 3;

const METHOD = 'evaporation tube';
const COLUMNS =
  'series_id, index, temperature_k, pressure_pa, pressure_origin, diffusivity_m2_s, diffusivity_u_m2_s, uncertainty_origin';

/** A table as a laboratory writes it: °C, kPa, cm²/s, decimal comma; D near ethanol in nitrogen, invented. */
function tableText(): string {
  const lines = ['T / °C;p / kPa;D / cm²/s;u(D) / %'];
  for (let i = 0; i < POINTS; i++) {
    const kelvin = 290 + i / 1000;
    const cm2 = 0.126 * (kelvin / 298.15) ** 1.75 * (1 + 0.004 * Math.sin(12.9898 * i));
    lines.push(`${(kelvin - 273.15).toFixed(3)};101,325;${cm2.toFixed(6)};1,5`.replaceAll('.', ','));
  }
  return lines.join('\n');
}

/** The same points as PostgreSQL's COPY takes them, made beforehand. */
function* copyLines(seriesId: string): Generator<string> {
  for (let start = 0; start < POINTS; start += 2000) {
    let chunk = '';
    for (let i = start; i < start + 2000; i++) {
      const d = 1.26e-5 * ((290 + i / 1000) / 298.15) ** 1.75;
      chunk += `${seriesId}\t${i}\t${290 + i / 1000}\t101325\tSTATED\t${d}\t${0.015 * d}\tSTATED\n`;
    }
    yield chunk;
  }
}

/** Milliseconds on the clock and of this process's processor. */
interface Cost {
  wall: number;
  cpu: number;
}

async function timed(work: () => Promise<unknown>): Promise<Cost> {
  const begun = performance.now();
  const before = process.cpuUsage();
  await work();
  const { user, system } = process.cpuUsage(before);
  return { wall: performance.now() - begun, cpu: (user + system) / 1000 };
}

const medianOf = (costs: readonly Cost[]): Cost => ({
  wall: median(costs.map(({ wall }) => wall)),
  cpu: median(costs.map(({ cpu }) => cpu)),
});

interface Bench {
  app: INestApplication;
  dataFolder: string;
  client: pg.Client;
  personId: string;
}

async function prepare(databaseUrl: string): Promise<Bench> {
  await migrate(databaseUrl);
  const dataFolder = await fs.mkdtemp(path.join(os.tmpdir(), 'diffolio-bench-import-'));
  const app = await createApp(
    readEnv({ DATABASE_URL: databaseUrl, DIFFOLIO_DATA_DIR: dataFolder, LOG_LEVEL: 'error' }),
  );
  await app.init();
  const client = new pg.Client(databaseUrl);
  await client.connect();
  const { rows } = await client.query<{ id: string }>(
    `INSERT INTO people (email, name, roles) VALUES ('bench@example.org', 'bench', '{RESEARCHER}') RETURNING id`,
  );
  await client.query(
    `INSERT INTO substances (name, formula, molar_mass_kg_mol)
     VALUES ('ethanol', 'C2H6O', 0.046068), ('nitrogen', 'N2', 0.0280134) ON CONFLICT DO NOTHING`,
  );
  return { app, dataFolder, client, personId: rows[0]!.id };
}

/** COPY alone: rows made beforehand, into the same table under the same constraints, committed. */
async function copyAlone({ client, personId }: Bench): Promise<Cost> {
  await client.query(
    'INSERT INTO gas_pairs (first_id, second_id) SELECT min(id::text)::uuid, max(id::text)::uuid FROM substances ON CONFLICT DO NOTHING',
  );
  const seriesId = randomUUID();
  await client.query(
    `INSERT INTO series (id, pair_id, title, source, method, created_by_id)
     SELECT $1, id, 'copy', 'copy', $2, $3 FROM gas_pairs LIMIT 1`,
    [seriesId, METHOD, personId],
  );
  const chunks = [...copyLines(seriesId)];
  return timed(async () => {
    await client.query('BEGIN');
    await pipeline(Readable.from(chunks), client.query(copyFrom(`COPY series_points (${COLUMNS}) FROM STDIN`)));
    await client.query('COMMIT');
  });
}

/** The way of a file up to its points. */
async function understandTable(bytes: Buffer): Promise<UnderstoodPoint[]> {
  const table = await readText(async function* () {
    yield await Promise.resolve(bytes);
  });
  const expectation = { estimate: null, estimateLabel: null, usualRelativeUncertainty: 0.02 };
  const { points, isComplete } = understand(table, recognise(table).mapping, {}, expectation);
  if (!isComplete || points.length !== POINTS) throw new Error('the table was not understood');
  return points;
}

/** The points checked and kept as a series, whole. */
async function store({ app, personId }: Bench, points: readonly UnderstoodPoint[]): Promise<void> {
  const series = app.get(SeriesService, { strict: false });
  const viewer = { id: personId, roles: ['RESEARCHER'], viaApiKey: false } as const;
  const header = {
    a: { name: 'ethanol' },
    b: { name: 'nitrogen' },
    title: 'bench',
    source: 'invented',
    method: METHOD,
  };
  const input = { ...header, points: points.map((point) => ({ ...point, pressureOrigin: PressureOrigin.STATED })) };
  const outcome = await series.create(input, viewer, null);
  if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
}

/** Import of 100,000 points beside PostgreSQL's COPY, in turns in the same run; medians. */
export async function benchImport(databaseUrl: string): Promise<BenchRow[]> {
  const bench = await prepare(databaseUrl);
  const bytes = Buffer.from(tableText());
  const copies: Cost[] = [];
  const understandings: Cost[] = [];
  const stores: Cost[] = [];
  try {
    for (let round = 0; round < ROUNDS; round++) {
      copies.push(await copyAlone(bench));
      let points: UnderstoodPoint[] = [];
      understandings.push(await timed(async () => (points = await understandTable(bytes))));
      stores.push(await timed(() => store(bench, points)));
    }
  } finally {
    await bench.client.end();
    await bench.app.close();
    await fs.rm(bench.dataFolder, { recursive: true, force: true });
  }
  return rowsOf(medianOf(copies), medianOf(understandings), medianOf(stores));
}

function rowsOf(copy: Cost, understood: Cost, stored: Cost): BenchRow[] {
  const cost = ({ wall, cpu }: Cost): string => `${wall.toFixed(0)} ms (processor of Node ${cpu.toFixed(0)} ms)`;
  const isMet = stored.wall <= MOST_MS && stored.wall <= MOST_TIMES_COPY * copy.wall;
  return [
    { name: '100,000 points by COPY alone', value: cost(copy), gate: null, met: null },
    {
      name: '100,000 points checked and stored as a series',
      value: `${cost(stored)}, ${(stored.wall / copy.wall).toFixed(2)} × COPY`,
      gate: `≤ ${MOST_MS} ms and ≤ ${MOST_TIMES_COPY} × COPY`,
      met: isMet,
    },
    { name: '100,000 rows of CSV read and understood', value: cost(understood), gate: null, met: null },
  ];
}
