import { fromSi, parseUnit, toSi, type Unit, unitOf, unitsOf } from '../../units/units.js';
import { parseCellNumber } from '../numbers.js';
import { doubt, type Issue } from '../issues.js';
import { farOut, sturdyQuartiles } from './quartiles.js';
import { type Judged, short } from './judged.js';

/** Temperatures of one table may spread by so much without the middle half saying so, K. */
const LEAST_TEMPERATURE_RANGE = 10;
/** Likewise for the logarithm of the pressure. */
const LEAST_LOG_PRESSURE_RANGE = 0.05;
/** Fewer rows have no middle to stand out from. */
const FEWEST_ROWS = 3;

const TEMPERATURE_SCALES = ['K', '°C', '°F'].map(unitOf);

/** Cells that look as if they were in another unit than their column: 323.2 among 45 °C, 1014 among 101.3 kPa. */
export function cellUnitDoubts(judged: Judged): Issue[] {
  return [...temperatureDoubts(judged), ...pressureDoubts(judged)];
}

interface Reading {
  value: number;
  label: string;
}

function temperatureDoubts(judged: Judged): Issue[] {
  const column = judged.columnOf('TEMPERATURE');
  const unit = unitOfColumn(judged, column);
  const middle = sturdyQuartiles(judged.temperature);
  if (unit === null || middle === null || judged.rows.length < FEWEST_ROWS) return [];
  const { lowest, highest } = farOut(middle, LEAST_TEMPERATURE_RANGE);
  const isUsual = (value: number): boolean => value >= lowest && value <= highest;
  return outliers(judged, judged.temperature, isUsual).flatMap((i) => {
    const typed = typedNumber(judged, i, column);
    const reading = TEMPERATURE_SCALES.filter((scale) => scale.symbol !== unit.symbol)
      .map((scale) => ({ value: toSi(typed, scale), label: scale.symbol }))
      .find(({ value }) => isUsual(value));
    if (reading === undefined) return [];
    const message = `Looks like ${reading.label} in a column of ${unit.symbol}; it would be ${short(fromSi(reading.value, unit))} ${unit.symbol}.`;
    return [ask(judged, { i, column, unit, values: judged.temperature, reading }, message)];
  });
}

function pressureDoubts(judged: Judged): Issue[] {
  const column = judged.columnOf('PRESSURE');
  const unit = unitOfColumn(judged, column);
  const middle = sturdyQuartiles(judged.pressure.map(Math.log));
  if (unit === null || middle === null || judged.rows.length < FEWEST_ROWS) return [];
  const { lowest, highest } = farOut(middle, LEAST_LOG_PRESSURE_RANGE);
  const isUsual = (value: number): boolean => Math.log(value) >= lowest && Math.log(value) <= highest;
  const distance = (value: number): number => Math.abs(Math.log(value) - middle.median);
  return outliers(judged, judged.pressure, isUsual).flatMap((i) => {
    const typed = typedNumber(judged, i, column);
    const reading = pressureReadings(typed, unit)
      .filter(({ value }) => isUsual(value))
      .sort((a, b) => distance(a.value) - distance(b.value))[0];
    if (reading === undefined) return [];
    const times = short(judged.pressureAt(i) / Math.exp(middle.median));
    const message = `${times} times its neighbours; in ${reading.label} it would be ${short(fromSi(reading.value, unit))} ${unit.symbol}.`;
    return [ask(judged, { i, column, unit, values: judged.pressure, reading }, message)];
  });
}

const pressureReadings = (typed: string, unit: Unit): Reading[] =>
  unitsOf('pressure')
    .filter(({ symbol }) => symbol !== unit.symbol)
    .map((other) => ({ value: toSi(typed, other), label: other.symbol }));

interface DoubtfulCell {
  i: number;
  column: number;
  unit: Unit;
  values: Float64Array;
  reading: Reading;
}

function ask(judged: Judged, { i, column, unit, values, reading }: DoubtfulCell, message: string): Issue {
  values[i] = reading.value;
  judged.reread[i] = 1;
  return doubt('UNIT_OF_CELL', judged.place(i, column), message, {
    choices: [
      { id: 'READ_AS', label: `read as ${reading.label}` },
      { id: 'KEEP', label: `keep ${judged.shown(i, column)} ${unit.symbol}` },
    ],
    suggested: 'READ_AS',
    readAs: { value: reading.value },
  });
}

const outliers = (judged: Judged, values: Float64Array, isUsual: (value: number) => boolean): number[] =>
  [...judged.rows.keys()].filter((i) => {
    const value = values[i] ?? Number.NaN;
    return Number.isFinite(value) && !isUsual(value);
  });

const unitOfColumn = (judged: Judged, column: number): Unit | null => {
  const unit = judged.mapping.columns[column]?.unit;
  return unit ? parseUnit(unit) : null;
};

/** The number of a cell that was read before, as exact text. */
export function typedNumber(judged: Judged, i: number, column: number): string {
  const cell = judged.rows[i]?.cells[column] ?? null;
  return parseCellNumber(cell, judged.mapping.decimal, true)?.text ?? 'NaN';
}
