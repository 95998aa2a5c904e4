import type { EvaluableCorrelation } from '../numerics/fitting/fit.types.js';
import { logarithmicAxis, deviationAxis, temperatureAxis } from './axis-ticks.js';
import { newLaboratoryHalfWidths, recommendedAt } from './correlation-values.js';
import { formatQuantity } from './format-quantity.js';
import { estimatesAlong } from './estimates-along.js';
import type { EstimatesAt, SeriesFacts } from './sheet-facts.js';
import type { FigureAxis, FigureCurve, FigureEstimate, FigureSeries, SheetFigures } from './sheet-figures.types.js';
import { extremes, seriesKey } from './sheet-series.js';
import { sheetStrings } from './sheet-strings.js';
import { plain, typeset } from './typeset.js';

/** How far beyond the rest a point that was left out may stretch the axis of deviations */
const LEFT_OUT_REACH = 3;
const CURVE_STEPS = 96;
const ESTIMATE_STEPS = 48;
/** Points of one series a figure can show apart; a longer series is thinned evenly. */
const MOST_POINTS = 1000;

/** Both figures of the sheet as data. */
export function sheetFigures(
  correlation: EvaluableCorrelation,
  series: readonly SeriesFacts[],
  estimates: EstimatesAt,
): SheetFigures {
  const pressure = correlation.referencePressure;
  const drawn = [...series]
    .sort((a, b) => Number(a.leftOutBecause !== null) - Number(b.leftOutBecause !== null))
    .map((one) => figureSeries(correlation, one));
  const axis = axisOfTemperatures(correlation, drawn);
  const curve = figureCurve(correlation, axis);
  const thinning = Math.max(1, ...series.map((one) => strideOf(one)));
  const thinned = thinning > 1 ? sheetStrings.figureThinned.replace('{nth}', `${thinning}th`) : '';
  return {
    pressure,
    temperatureAxis: axis,
    diffusivityAxis: axisOfDiffusivities(curve, drawn),
    deviationAxis: axisOfDeviations(curve, drawn),
    curve,
    series: drawn,
    estimates: figureEstimates(correlation, estimates, axis),
    diffusivityCaption: [
      ...typeset(sheetStrings.figure1, { pressure: formatQuantity('pressure', pressure) }),
      ...plain(thinned),
    ],
    deviationCaption: [...typeset(sheetStrings.figure2), ...plain(thinned)],
  };
}

const strideOf = (series: SeriesFacts): number => Math.ceil(series.points.temperatures.length / MOST_POINTS);

/** Points of a series reduced to P0 along the correlation, and their deviations from it. */
function figureSeries(correlation: EvaluableCorrelation, series: SeriesFacts): FigureSeries {
  const { points } = series;
  const stride = strideOf(series);
  const kept = points.temperatures.map((_, i) => i).filter((i) => i % stride === 0);
  const excluded = new Set(series.excluded.map((one) => one.index));
  const pick = (column: readonly number[]): number[] => kept.map((i) => column[i] ?? Number.NaN);
  const temperatures = pick(points.temperatures);
  const diffusivities = pick(points.diffusivities);
  const fitted = recommendedAt(correlation, temperatures, pick(points.pressures)).diffusivities;
  const fittedAtReference = recommendedAt(correlation, temperatures, [correlation.referencePressure]).diffusivities;
  const ratios = diffusivities.map((D, i) => D / at(fitted, i));
  return {
    key: seriesKey(series.ordinal),
    mark: series.ordinal,
    title: series.title,
    used: series.leftOutBecause === null,
    temperatures,
    reducedDiffusivities: ratios.map((ratio, i) => ratio * at(fittedAtReference, i)),
    relativeUncertainties: kept.map((i, j) => (points.diffusivityUncertainties[i] ?? 0) / at(diffusivities, j)),
    deviations: ratios.map((ratio) => 100 * (ratio - 1)),
    leftOut: kept.flatMap((i, j) => (series.leftOutBecause !== null || excluded.has(i) ? [j] : [])),
  };
}

const at = (column: ArrayLike<number>, i: number): number => column[i] ?? Number.NaN;

/** From the lowest to the highest temperature drawn, with a little air, since a point on the edge is cut. */
function axisOfTemperatures(correlation: EvaluableCorrelation, series: readonly FigureSeries[]): FigureAxis {
  const all = [
    correlation.validity.temperatureMinimum,
    correlation.validity.temperatureMaximum,
    ...series.flatMap((one) => one.temperatures),
  ];
  const [lowest, highest] = extremes(all);
  const air = Math.max(0.04 * (highest - lowest), 0.005 * highest);
  return temperatureAxis(Math.max(lowest - air, lowest / 2), highest + air);
}

function figureCurve(correlation: EvaluableCorrelation, axis: FigureAxis): FigureCurve {
  const { temperatureMinimum, temperatureMaximum } = correlation.validity;
  const temperatures = [
    ...new Set([...logarithmicSteps(axis, CURVE_STEPS), temperatureMinimum, temperatureMaximum]),
  ].sort((a, b) => a - b);
  const { diffusivities, expandedUncertainties } = recommendedAt(correlation, temperatures, [
    correlation.referencePressure,
  ]);
  const newLaboratory = newLaboratoryHalfWidths(correlation, temperatures);
  return {
    temperatures,
    diffusivities,
    relativeExpandedUncertainties: diffusivities.map((D, i) => at(expandedUncertainties, i) / D),
    relativeNewLaboratory: newLaboratory?.map((width, i) => width / at(diffusivities, i)) ?? null,
    firstInside: temperatures.indexOf(temperatureMinimum),
    lastInside: temperatures.indexOf(temperatureMaximum),
  };
}

function figureEstimates(
  correlation: EvaluableCorrelation,
  estimates: EstimatesAt,
  axis: FigureAxis,
): FigureEstimate[] {
  const pressure = correlation.referencePressure;
  return estimatesAlong(estimates, logarithmicSteps(axis, ESTIMATE_STEPS), pressure).map((column) => {
    const { method, temperatures } = column;
    const fitted = recommendedAt(correlation, temperatures, [pressure]).diffusivities;
    return { method, temperatures, deviations: column.diffusivities.map((D, i) => 100 * (D / at(fitted, i) - 1)) };
  });
}

const logarithmicSteps = ({ minimum, maximum }: FigureAxis, steps: number): number[] =>
  Array.from({ length: steps + 1 }, (_, i) => minimum * (maximum / minimum) ** (i / steps));

function axisOfDiffusivities(curve: FigureCurve, series: readonly FigureSeries[]): FigureAxis {
  const reach = series.flatMap((one) =>
    one.reducedDiffusivities.flatMap((D, i) => {
      const u = at(one.relativeUncertainties, i);
      return [D * Math.exp(-u), D * Math.exp(u)];
    }),
  );
  const all = [...curve.diffusivities, ...reach];
  const [lowest, highest] = extremes(all);
  const air = Math.max(1.02, (highest / lowest) ** 0.03);
  return logarithmicAxis(lowest / air, highest * air);
}

/**
 * Wide enough for nineteen in twenty of the points that carried weight and for the bands, and for points left out that do not
 * lie more than three times as far away.
 */
function axisOfDeviations(curve: FigureCurve, series: readonly FigureSeries[]): FigureAxis {
  const weighted = series
    .flatMap((one) => one.deviations.filter((_, i) => !one.leftOut.includes(i)))
    .map(Math.abs)
    .sort((a, b) => a - b);
  const most = weighted[Math.floor(0.95 * (weighted.length - 1))] ?? 0;
  const inside = (column: readonly number[]): number[] => column.slice(curve.firstInside, curve.lastInside + 1);
  const bands = [
    ...inside(curve.relativeExpandedUncertainties),
    ...(curve.relativeNewLaboratory === null ? [] : inside(curve.relativeNewLaboratory)),
  ].map((part) => 100 * part);
  const reach = 1.1 * Math.max(most, ...bands);
  const shown = series
    .flatMap((one) => one.deviations)
    .filter((deviation) => Math.abs(deviation) <= LEFT_OUT_REACH * reach);
  return deviationAxis(Math.min(-reach, ...extremes(shown)), Math.max(reach, ...extremes(shown)));
}
