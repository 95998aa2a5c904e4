import { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { Injectable } from '@nestjs/common';
import { type PoolClient } from 'pg';
import { from as copyFrom } from 'pg-copy-streams';
import { DataSource, EntityManager } from 'typeorm';
import { type PressureOrigin, type SeriesPoint, type UncertaintyOrigin } from './series.entity.js';

/** One point ready to be kept, SI. */
export type NewSeriesPoint = Omit<SeriesPoint, 'id'>;

interface PointRow {
  series_id: string;
  index: number;
  temperature_k: number;
  pressure_pa: number;
  pressure_origin: PressureOrigin;
  diffusivity_m2_s: number;
  diffusivity_u_m2_s: number | null;
  uncertainty_origin: UncertaintyOrigin | null;
  temperature_u_k: number | null;
  pressure_u_pa: number | null;
  mole_fraction: number | null;
  replicates: number | null;
}

const COLUMNS =
  'series_id, index, temperature_k, pressure_pa, pressure_origin, diffusivity_m2_s, diffusivity_u_m2_s, uncertainty_origin, temperature_u_k, pressure_u_pa, mole_fraction, replicates';

/** Rows handed to COPY in one piece of text. */
const ROWS_PER_CHUNK = 2_000;

/** Id of a point: its series and its place there. Points have no identity beyond that. */
export function pointId(seriesId: string, index: number): string {
  return `${seriesId}:${index}`;
}

/** The place a point id names, or null when it is not one of ours. */
export function parsePointId(id: string): { seriesId: string; index: number } | null {
  const match = /^([0-9a-f-]{36}):(\d{1,9})$/.exec(id);
  return match ? { seriesId: match[1]!, index: Number(match[2]) } : null;
}

/** Points by the row, in the table made for them; entities would cost a hundred times as much. */
@Injectable()
export class SeriesPointsStore {
  constructor(private readonly dataSource: DataSource) {}

  /** Batch function for `loaderFor`: the points of each series in their order. */
  readonly bySeries = async (seriesIds: readonly string[]): Promise<SeriesPoint[][]> => {
    const bySeries = await this.load(this.dataSource.manager, seriesIds);
    return seriesIds.map((id) => bySeries.get(id) ?? []);
  };

  async load(manager: EntityManager, seriesIds: readonly string[]): Promise<Map<string, SeriesPoint[]>> {
    const rows: PointRow[] = await manager.query(
      `SELECT ${COLUMNS} FROM series_points WHERE series_id = ANY ($1) ORDER BY series_id, index`,
      [seriesIds],
    );
    const bySeries = new Map<string, SeriesPoint[]>();
    for (const row of rows) {
      const points = bySeries.get(row.series_id) ?? [];
      bySeries.set(row.series_id, points);
      points.push({
        id: pointId(row.series_id, row.index),
        temperature: row.temperature_k,
        pressure: row.pressure_pa,
        pressureOrigin: row.pressure_origin,
        diffusivity: row.diffusivity_m2_s,
        diffusivityUncertainty: row.diffusivity_u_m2_s,
        uncertaintyOrigin: row.uncertainty_origin,
        temperatureUncertainty: row.temperature_u_k,
        pressureUncertainty: row.pressure_u_pa,
        moleFraction: row.mole_fraction,
        replicates: row.replicates,
      });
    }
    return bySeries;
  }

  /** Puts the points of a new series in, in the caller's transaction, by COPY. */
  async insert(tx: EntityManager, seriesId: string, points: readonly NewSeriesPoint[]): Promise<void> {
    const client = (await tx.queryRunner?.connect()) as PoolClient | undefined;
    if (!client) throw new Error('points go in inside a transaction');
    await pipeline(
      Readable.from(copyText(seriesId, points)),
      client.query(copyFrom(`COPY series_points (${COLUMNS}) FROM STDIN`)),
    );
  }

  async replace(tx: EntityManager, seriesId: string, points: readonly NewSeriesPoint[]): Promise<void> {
    await tx.query('DELETE FROM series_points WHERE series_id = $1', [seriesId]);
    await this.insert(tx, seriesId, points);
  }
}

/** The rows as COPY's text format; no field can hold a tab, a backslash or a line break. */
function* copyText(seriesId: string, points: readonly NewSeriesPoint[]): Generator<string> {
  const field = (value: number | string | null) => (value === null ? '\\N' : String(value));
  for (let start = 0; start < points.length; start += ROWS_PER_CHUNK) {
    let text = '';
    for (let i = start; i < Math.min(start + ROWS_PER_CHUNK, points.length); i += 1) {
      const point = points[i]!;
      text += `${seriesId}\t${i}\t${point.temperature}\t${point.pressure}\t${point.pressureOrigin}\t${point.diffusivity}\t${field(
        point.diffusivityUncertainty,
      )}\t${field(point.uncertaintyOrigin)}\t${field(point.temperatureUncertainty)}\t${field(point.pressureUncertainty)}\t${field(
        point.moleFraction,
      )}\t${field(point.replicates)}\n`;
    }
    yield text;
  }
}
