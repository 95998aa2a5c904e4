import { factorBetween, fromSi, parseUnit, toSi, type Unit, unitsOf } from '../../units/units.js';
import { doubt, type Issue } from '../issues.js';
import { typedNumber } from './cell-units.js';
import { anyPair, type Expectation } from './context.js';
import { type Judged, short } from './judged.js';
import { farOut, quartiles } from './quartiles.js';

/** Fewer points have no interquartile range worth the name. */
const FEWEST_FOR_QUARTILES = 6;
/** A cell this many times off its neighbours (natural logarithm) may have a shifted decimal sign or another unit. */
const SHIFT_FROM = Math.log(3);
/** A re-reading explains a cell when it brings it so near. */
const EXPLAINED_WITHIN = Math.log(1.35);
/** Interquartile range of a normal distribution in standard deviations. */
const RANGE_OF_NORMAL = 1.349;

/** ln(D/D(estimate)) of each row, NaN where it cannot be had. */
function logRatios(judged: Judged, { estimate }: Expectation): Float64Array {
  const ratios = new Float64Array(judged.rows.length).fill(Number.NaN);
  for (const i of judged.complete) ratios[i] = logRatio(judged, i, estimate ?? anyPair);
  return ratios;
}

function logRatio(judged: Judged, i: number, estimate: (t: number, p: number) => number | null): number {
  const expected = estimate(judged.temperatureAt(i), judged.pressureAt(i));
  return expected === null ? Number.NaN : Math.log(judged.diffusivityAt(i) / expected);
}

/**
 * Diffusivities of the wrong size: a shifted decimal sign or another unit where that explains a cell, else a ratio to the
 * estimate that is far out (three interquartile ranges) among those of the table.
 */
export function diffusivitySizeDoubts(judged: Judged, expectation: Expectation): Issue[] {
  const column = judged.columnOf('DIFFUSIVITY');
  const unit = parseUnit(judged.mapping.columns[column]?.unit ?? '', 'diffusivity');
  const ratios = logRatios(judged, expectation);
  const middle = quartiles(ratios);
  if (unit === null || middle === null) return [];
  // One or two points stand out from the estimate alone.
  const centre = judged.complete.length < 3 && expectation.estimate !== null ? 0 : middle.median;
  const shifted = judged.complete.flatMap((i) =>
    shiftDoubt(judged, { i, column, unit, off: (ratios[i] ?? 0) - centre }),
  );
  return [...shifted, ...farFromEstimate(judged, ratios, expectation)];
}

interface OffCell {
  i: number;
  column: number;
  unit: Unit;
  /** natural logarithm of how many times too large */
  off: number;
}

function shiftDoubt(judged: Judged, cell: OffCell): Issue[] {
  const { i, column, unit, off } = cell;
  if (Math.abs(off) < SHIFT_FROM) return [];
  const typed = typedNumber(judged, i, column);
  const reading = otherUnit(typed, cell) ?? shiftedSign(typed, cell);
  if (reading === null) return [];
  judged.diffusivity[i] = reading.value;
  judged.reread[i] = 1;
  const times = Math.exp(Math.abs(off));
  const message = `${off > 0 ? short(times) : `1/${short(times)}`} times what its neighbours suggest; ${reading.question}`;
  return [
    doubt(reading.code, judged.place(i, column), message, {
      choices: [
        { id: 'READ_AS', label: `read as ${reading.label}` },
        { id: 'KEEP', label: `keep ${judged.shown(i, column)} ${unit.symbol}` },
      ],
      readAs: { value: reading.value },
    }),
  ];
}

interface OtherReading {
  code: 'UNIT_OF_CELL' | 'DECIMAL_SHIFT';
  value: number;
  label: string;
  question: string;
}

const USUAL_UNITS = new Set(['m²/s', 'cm²/s', 'mm²/s']);

function otherUnit(typed: string, { unit, off }: OffCell): OtherReading | null {
  const other = unitsOf('diffusivity').find(
    (one) =>
      USUAL_UNITS.has(one.symbol) &&
      // A hundred or less is sooner a slip of the decimal sign.
      Math.abs(Math.log10(factorBetween(one, unit))) > 2.5 &&
      Math.abs(off + Math.log(factorBetween(one, unit))) < EXPLAINED_WITHIN,
  );
  if (other === undefined) return null;
  return {
    code: 'UNIT_OF_CELL',
    value: toSi(typed, other),
    label: other.symbol,
    question: `is it in ${other.symbol}?`,
  };
}

function shiftedSign(typed: string, { unit, off }: OffCell): OtherReading | null {
  const places = Math.round(off / Math.LN10);
  if (places === 0 || Math.abs(places) > 6 || Math.abs(off - places * Math.LN10) > EXPLAINED_WITHIN) return null;
  const value = toSi(
    `${typed}e${-places}`.replace(/e([+-]?\d+)e([+-]?\d+)$/i, (_, a: string, b: string) => `e${Number(a) + Number(b)}`),
    unit,
  );
  return { code: 'DECIMAL_SHIFT', value, label: short(fromSi(value, unit)), question: 'a shifted decimal sign?' };
}

function farFromEstimate(judged: Judged, all: Float64Array, expectation: Expectation): Issue[] {
  const column = judged.columnOf('DIFFUSIVITY');
  const ratios = all.map((ratio, i) => (judged.reread[i] ? Number.NaN : ratio));
  const middle = quartiles(ratios);
  if (middle === null || ratios.filter(Number.isFinite).length < FEWEST_FOR_QUARTILES) return [];
  const relative = quartiles(
    judged.complete.map((i) => judged.relativeUncertaintyAt(i, expectation.usualRelativeUncertainty)),
  );
  const { lowest, highest } = farOut(middle, RANGE_OF_NORMAL * (relative?.median ?? 0));
  return judged.complete.flatMap((i) => {
    const ratio = ratios[i] ?? Number.NaN;
    if (!(ratio < lowest || ratio > highest)) return [];
    judged.far[i] = 1;
    const against =
      expectation.estimate === null ? 'the others, T and P allowed for' : `the estimate (${expectation.estimateLabel})`;
    const message = `${short(100 * Math.expm1(ratio - middle.median))} % off the middle of the table when compared with ${against}; more than 3 interquartile ranges.`;
    return [
      doubt('FAR_FROM_ESTIMATE', judged.place(i, column), message, {
        choices: [{ id: 'KEEP', label: 'keep, it is measured' }],
      }),
    ];
  });
}
