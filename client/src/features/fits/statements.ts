import { type StatisticsNumbersFragment } from '../../gql/graphql';
import { fill } from '../../lib/fill';
import { formatNumber, formatShort } from '../../lib/format-quantity';
import { fitStrings } from '../../strings/fits';
import { deviationText } from './small-number';

/** A test or a doubt as a sentence: what it finds, then why. */
export interface Statement {
  readonly tone: 'met' | 'note' | 'warning';
  readonly verdict: string;
  readonly reason: string;
}

interface FitWarning {
  readonly code: string;
  readonly message: string;
}

/** Doubts that a reader must weigh; the others only say what was done. */
const GRAVE = new Set([
  'ONE_SERIES',
  'TWO_TEMPERATURES',
  'NARROW_TEMPERATURE_RANGE',
  'EXCESS_SCATTER',
  'INFLUENTIAL_POINT',
  'STRONG_CORRELATION',
]);

const { recipe } = fitStrings;
const NAMES: Readonly<Record<string, string>> = {
  ...recipe.allForms,
  ...recipe.losses,
  ...recipe.seriesEffects,
  ...recipe.objectives,
};

/** A message of the service as a sentence, the choices in it named as the recipe names them. */
export function asSentence(message: string): string {
  const named = message.replace(/\b[A-Z]+(_[A-Z]+)*\b/g, (name) => NAMES[name] ?? name);
  return /[.!?]$/.test(named) ? named : `${named}.`;
}

/** A doubt of the service as a sentence, parted at its first colon. */
export function doubt({ code, message }: FitWarning): Statement {
  const colon = message.indexOf(': ');
  const tone = GRAVE.has(code) ? 'warning' : 'note';
  if (colon < 0) return { tone, verdict: asSentence(message), reason: '' };
  const rest = message.slice(colon + 2);
  return { tone, verdict: `${message.slice(0, colon)}:`, reason: asSentence(rest) };
}

const ORDER = { met: 0, note: 1, warning: 2 } as const;
const words = fitStrings.decides;
const IMPROBABLE = 0.05;

/** What the statistics of a fit say, then its doubts: what is met first, what warns last. */
export function decisions(statistics: StatisticsNumbersFragment, warnings: readonly FitWarning[]): Statement[] {
  return [...scatter(statistics), ...betweenSeries(statistics), ...warnings.map(doubt)].sort(
    (a, b) => ORDER[a.tone] - ORDER[b.tone],
  );
}

function scatter(statistics: StatisticsNumbersFragment): Statement[] {
  const { reducedChiSquare, chiSquareProbability: p, residualDegreesOfFreedom } = statistics;
  if (reducedChiSquare == null || p == null)
    return [{ tone: 'note', verdict: words.noUncertainties, reason: words.noUncertaintiesReason }];
  const values = { reduced: formatNumber(reducedChiSquare, 2), nu: residualDegreesOfFreedom, p: probability(p) };
  return p >= IMPROBABLE
    ? [{ tone: 'met', verdict: words.scatterMet, reason: fill(words.scatterReason, values) }]
    : [{ tone: 'warning', verdict: words.scatterNotMet, reason: fill(words.scatterReason, values) }];
}

function betweenSeries(statistics: StatisticsNumbersFragment): Statement[] {
  const { betweenSeriesDeviation: tau, betweenSeriesOrigin, cochranQ, seriesCount } = statistics;
  if (tau == null || cochranQ == null || betweenSeriesOrigin !== 'STATED') return [];
  const values = { tau: deviationText(100 * tau), q: formatNumber(cochranQ, 1), nu: seriesCount - 1 };
  const differ = cochranQ > seriesCount - 1 && tau > 0;
  return [
    differ
      ? { tone: 'note', verdict: words.differ, reason: fill(words.differReason, values) }
      : { tone: 'met', verdict: words.agree, reason: fill(words.agreeReason, values) },
  ];
}

/** A probability with its relation: `= 0.85`, or below the smallest worth telling. */
export const probability = (p: number): string => (p < 0.001 ? '< 0.001' : `= ${formatShort(p, 2)}`);
