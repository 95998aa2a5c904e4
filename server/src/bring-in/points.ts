import type { Measured } from './convert.js';
import type { TableMapping } from './mapping.js';
import { columnIsIndependent, constantUncertainty } from './uncertainty.js';

/** A point in SI; null for what was not stated. */
export interface UnderstoodPoint {
  /** number of the row it stands in */
  row: number;
  temperature: number;
  pressure: number;
  diffusivity: number;
  diffusivityUncertainty: number | null;
  temperatureUncertainty: number | null;
  pressureUncertainty: number | null;
  moleFraction: number | null;
  replicates: number | null;
}

/** OPEN: something about the row is refused or not decided. */
export type RowState = 'KEPT' | 'LEFT_OUT' | 'OPEN';

/** The points of the rows that are not left out and whose T, P and D were read. */
export function pointsOf(mapping: TableMapping, measured: Measured, states: readonly RowState[]): UnderstoodPoint[] {
  const points: UnderstoodPoint[] = [];
  const independent = columnIsIndependent(mapping);
  const forAll = mapping.diffusivityUncertainty?.reading.scope === 'INDEPENDENT';
  states.forEach((state, i) => {
    const [temperature, pressure, diffusivity] = [
      measured.temperature[i],
      measured.pressure[i],
      measured.diffusivity[i],
    ];
    if (state === 'LEFT_OUT' || !isRead(temperature) || !isRead(pressure) || !isRead(diffusivity)) return;
    const stated = independent
      ? absolute(measured.diffusivityUncertainty[i], measured.relative.diffusivity, diffusivity)
      : null;
    points.push({
      row: measured.rows[i] ?? 0,
      temperature,
      pressure,
      diffusivity,
      diffusivityUncertainty: stated ?? (forAll ? constantUncertainty(mapping, diffusivity) : null),
      temperatureUncertainty: absolute(measured.temperatureUncertainty[i], measured.relative.temperature, temperature),
      pressureUncertainty: absolute(measured.pressureUncertainty[i], measured.relative.pressure, pressure),
      moleFraction: orNull(measured.moleFraction[i]),
      replicates: orNull(measured.replicates[i]),
    });
  });
  return points;
}

const isRead = (value: number | undefined): value is number => value !== undefined && Number.isFinite(value);

const orNull = (value: number | undefined): number | null => (isRead(value) ? value : null);

const absolute = (uncertainty: number | undefined, isRelative: boolean, value: number): number | null =>
  isRead(uncertainty) ? (isRelative ? uncertainty * value : uncertainty) : null;
