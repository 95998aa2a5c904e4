import { factorBetween, parseUnit, toSi, type Unit, unitOf } from '../../units/units.js';
import { doubt, type Issue } from '../issues.js';
import { NAME_OF_ROLE } from '../mapping.js';
import { typedNumber } from './cell-units.js';
import { anyPair, type Expectation } from './context.js';
import { type Judged, short } from './judged.js';
import { quartiles } from './quartiles.js';

/** Natural logarithms: how far off a table must be before a unit is doubted, and how near another unit must bring it. */
interface Tolerance {
  off: number;
  agrees: number;
}
/** Estimates for gases are seldom wrong by more than a quarter (METHODS' usual errors are 4 to 8 %). */
const WITH_ESTIMATE: Tolerance = { off: Math.log(2.5), agrees: Math.log(1.8) };
/** Without one, pairs differ among themselves (0.02 to 2 cm²/s at ambient conditions). */
const WITHOUT_ESTIMATE: Tolerance = { off: Math.log(40), agrees: Math.log(12) };

const ALTERNATIVES = {
  DIFFUSIVITY: ['cm²/s', 'm²/s', 'mm²/s'],
  TEMPERATURE: ['K', '°C'],
  PRESSURE: ['kPa', 'Pa', 'atm', 'mmHg'],
} as const;
const ROLES = ['DIFFUSIVITY', 'TEMPERATURE', 'PRESSURE'] as const;

/** A column that as a whole seems to be in another unit: D off by 10^4, T in °C read as K. */
export function columnUnitDoubts(judged: Judged, expectation: Expectation): Issue[] {
  const tolerance = expectation.estimate === null ? WITHOUT_ESTIMATE : WITH_ESTIMATE;
  const estimate = expectation.estimate ?? anyPair;
  const asRead = medianLogRatio(judged, estimate, (i) => judged.temperatureAt(i));
  if (asRead === null || Math.abs(asRead) < tolerance.off) return [];
  const explanations = ROLES.flatMap((role) => explain(judged, role, { asRead, estimate }))
    .filter(({ left }) => Math.abs(left) < tolerance.agrees)
    .sort((a, b) => Math.abs(a.left) - Math.abs(b.left));
  const best = explanations[0];
  const size = `D is ${timesOff(asRead)} ${expectation.estimate === null ? 'what gases have' : `the estimate (${expectation.estimateLabel})`}`;
  if (best === undefined) {
    const choices = [{ id: 'KEEP', label: 'keep, the units are right' }] as const;
    const at = { row: null, column: judged.columnOf('DIFFUSIVITY') };
    return [
      doubt('FAR_FROM_ESTIMATE', at, `${size}, in all rows. Are units, substances and pressure right?`, {
        choices: [...choices],
      }),
    ];
  }
  const message = `With the ${NAME_OF_ROLE[best.role]} in ${best.from}, ${size}; in ${best.to} it would agree.`;
  return [
    doubt('UNIT_OFF', { row: null, column: judged.columnOf(best.role) }, message, {
      choices: [
        { id: 'READ_AS', label: `read the column as ${best.to}` },
        { id: 'KEEP', label: `it is ${best.from}` },
      ],
      readAs: { unit: best.to },
    }),
  ];
}

const timesOff = (log: number): string => (log > 0 ? `${short(Math.exp(log))} times` : `1/${short(Math.exp(-log))} of`);

type Estimate = (temperature: number, pressure: number) => number | null;

function medianLogRatio(judged: Judged, estimate: Estimate, temperatureAt: (i: number) => number): number | null {
  const ratios = sample(judged.complete).map((i) => {
    const temperature = temperatureAt(i);
    const expected = temperature > 0 ? estimate(temperature, judged.pressureAt(i)) : null;
    return expected === null ? Number.NaN : Math.log(judged.diffusivityAt(i) / expected);
  });
  return quartiles(ratios)?.median ?? null;
}

/** So many rows tell the median of a long table well enough to know its unit. */
const ROWS_SAMPLED = 1_000;

function sample(rows: readonly number[]): readonly number[] {
  const step = Math.ceil(rows.length / ROWS_SAMPLED);
  return step <= 1 ? rows : rows.filter((_, place) => place % step === 0);
}

interface Explanation {
  role: (typeof ROLES)[number];
  from: string;
  to: string;
  /** what is left of the logarithm */
  left: number;
}

function explain(
  judged: Judged,
  role: Explanation['role'],
  { asRead, estimate }: { asRead: number; estimate: Estimate },
): Explanation[] {
  const column = judged.columnOf(role);
  const unit = parseUnit(judged.mapping.columns[column]?.unit ?? '');
  if (unit === null) return [];
  return ALTERNATIVES[role]
    .filter((symbol) => symbol !== unit.symbol)
    .flatMap((symbol) => {
      const other = unitOf(symbol);
      const left =
        role === 'TEMPERATURE'
          ? temperatureLeft(judged, { column, other, estimate })
          : asRead + Math.log(factorBetween(other, unit));
      return left === null ? [] : [{ role, from: unit.symbol, to: symbol, left }];
    });
}

const temperatureLeft = (
  judged: Judged,
  { column, other, estimate }: { column: number; other: Unit; estimate: Estimate },
): number | null => medianLogRatio(judged, estimate, (i) => toSi(typedNumber(judged, i, column), other));
