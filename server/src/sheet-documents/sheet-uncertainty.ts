import type { EvaluableCorrelation } from '../numerics/fitting/fit.types.js';
import { formatExtent, formatQuantity, formatShort, formatUncertainty, withUnit } from './format-quantity.js';
import type { SheetUncertainty } from './sheet-content.types.js';
import type { FitFacts, SeriesFacts, SheetFacts, SubstanceFacts } from './sheet-facts.js';
import { extremes, seriesKey, weightedTemperaturesByMethod } from './sheet-series.js';
import { sheetStrings } from './sheet-strings.js';
import { plain, typeset } from './typeset.js';
import type { TextRun } from './typeset.types.js';

/** What U is, and what it does not contain. */
export function sheetUncertainty(facts: SheetFacts, coverageFactor: number): SheetUncertainty {
  const { correlation, fit, series, substances } = facts;
  return {
    statement: [
      expandedStatement(correlation.degreesOfFreedom, coverageFactor),
      ...(correlation.betweenSeries === null ? [] : [typeset(sheetStrings.newLaboratory)]),
      ...assignments(fit, series),
    ],
    notIncluded: [
      typeset(sheetStrings.biasNotIncluded),
      ...singleMethodStretches(correlation, series).map(({ method, minimum, maximum }) =>
        typeset(sheetStrings.singleMethod, { method, extent: formatExtent('temperature', minimum, maximum) }),
      ),
      typeset(sheetStrings.composition, { extent: compositionExtent(series, substances[0]) }),
    ],
  };
}

function expandedStatement(degreesOfFreedom: number | null, coverageFactor: number): TextRun[] {
  const basis =
    degreesOfFreedom === null
      ? sheetStrings.normalBasis
      : sheetStrings.studentBasis.replace('{degrees}', formatShort(degreesOfFreedom, 3));
  return typeset(sheetStrings.expanded, { k: coverageFactor.toFixed(2), basis: typeset(basis) });
}

/** What stands in for something that no source states. */
function assignments(fit: FitFacts, series: readonly SeriesFacts[]): TextRun[][] {
  const { betweenSeriesDeviation: tau, betweenSeriesOrigin: origin } = fit.statistics;
  const keys = series
    .filter((one) => one.leftOutBecause === null && one.points.uncertaintyOrigins.includes('ASSIGNED'))
    .map((one) => seriesKey(one.ordinal));
  return [
    ...(tau !== null && origin === 'ASSIGNED'
      ? [typeset(sheetStrings.assignedScatter, { tau: withUnit(formatUncertainty(100 * tau), '%') })]
      : []),
    ...(keys.length > 0 ? [typeset(sheetStrings.assignedUncertainty, { keys: keys.join(', ') })] : []),
  ];
}

interface Stretch {
  readonly method: string;
  readonly minimum: number;
  readonly maximum: number;
}

/**
 * Parts of the validity range that the points of one method alone cover.
 *
 * A method covers all temperatures from its lowest to its highest point.
 */
export function singleMethodStretches(correlation: EvaluableCorrelation, series: readonly SeriesFacts[]): Stretch[] {
  const { temperatureMinimum, temperatureMaximum } = correlation.validity;
  const extents = [...weightedTemperaturesByMethod(series)]
    .filter(([, temperatures]) => temperatures.length > 0)
    .map(([method, temperatures]) => ({ method, extent: extremes(temperatures) }));
  const ends = [...new Set([temperatureMinimum, temperatureMaximum, ...extents.flatMap(({ extent }) => extent)])]
    .filter((T) => T >= temperatureMinimum && T <= temperatureMaximum)
    .sort((a, b) => a - b);
  const stretches: Stretch[] = [];
  ends.slice(1).forEach((maximum, i) => {
    const minimum = ends[i] ?? maximum;
    const covering = extents.filter(({ extent }) => extent[0] <= minimum && extent[1] >= maximum);
    const [only] = covering;
    if (only === undefined || covering.length > 1) return;
    const last = stretches.at(-1);
    if (last?.method === only.method && last.maximum === minimum)
      stretches[stretches.length - 1] = { ...last, maximum };
    else stretches.push({ method: only.method, minimum, maximum });
  });
  return stretches;
}

function compositionExtent(series: readonly SeriesFacts[], first: SubstanceFacts): string {
  const stated = series
    .filter((one) => one.leftOutBecause === null)
    .flatMap((one) => one.points.moleFractions)
    .filter((fraction) => fraction !== null);
  if (stated.length === 0) return sheetStrings.compositionUnknown;
  const [minimum, maximum] = extremes(stated);
  return sheetStrings.compositionStated
    .replace('{substance}', first.name)
    .replace('{minimum}', formatShort(minimum, 3))
    .replace('{maximum}', formatShort(maximum, 3));
}

/** The usual cautions, those of the two substances among them. */
export function sheetCautions(facts: SheetFacts): TextRun[][] {
  const { cautions } = sheetStrings;
  const { validity } = facts.correlation;
  return [
    typeset(cautions.extrapolation, {
      minimum: formatQuantity('temperature', validity.temperatureMinimum),
      maximum: formatQuantity('temperature', validity.temperatureMaximum),
    }),
    typeset(cautions.density, {
      pressure: formatExtent('pressure', validity.pressureMinimum, validity.pressureMaximum),
    }),
    ...facts.substances.flatMap((substance) =>
      substance.cautions.map((caution): TextRun[] => [
        { text: `${capitalised(substance.name)}: `, style: 'STRONG' },
        ...plain(caution),
      ]),
    ),
    plain(cautions.ventilation),
    plain(cautions.design),
  ];
}

/** A name at the beginning of a sentence or a line. */
export const capitalised = (name: string): string => name.charAt(0).toUpperCase() + name.slice(1);
