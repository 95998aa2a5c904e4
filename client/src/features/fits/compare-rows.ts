import { type KeptFitFragment } from '../../gql/graphql';

/** A fit with its values along the common temperatures, SI. */
export interface Compared {
  readonly fit: KeptFitFragment;
  readonly temperatures: readonly number[];
  readonly diffusivities: readonly number[];
  readonly standardUncertainties: readonly number[];
  readonly expandedUncertainties: readonly number[];
}

/** One line of the table: a quantity of each fit, and how much the last differs from the first. */
export interface CompareRow {
  readonly id: string;
  readonly kind: 'parameter' | 'statistic' | 'diffusivity';
  /** K, of a diffusivity. */
  readonly temperature?: number;
  readonly cells: readonly (CompareCell | null)[];
  /** Relative (diffusivities), or plain difference (AICc); null where there is none to tell. */
  readonly change: number | null;
}

export interface CompareCell {
  readonly value: number;
  readonly uncertainty: number | null;
  readonly unit: string;
}

const cell = (
  value: number | null | undefined,
  uncertainty: number | null | undefined = null,
  unit = '1',
): CompareCell | null => (value == null ? null : { value, uncertainty: uncertainty ?? null, unit });

/** Parameters that one fit or the other has, its statistics, and D at both ends of the common range and at T0. */
export function compareRows(all: readonly Compared[], at: readonly number[]): CompareRow[] {
  const symbols = [...new Set(all.flatMap(({ fit }) => fit.correlation.parameters.map(({ symbol }) => symbol)))];
  const parameters = symbols.map((symbol): CompareRow => ({
    id: symbol,
    kind: 'parameter',
    cells: all.map(({ fit }) => {
      const found = fit.correlation.parameters.find((parameter) => parameter.symbol === symbol);
      return found === undefined ? null : cell(found.value, found.standardUncertainty, found.unit);
    }),
    change: null,
  }));
  const statistic = (id: string, read: (fit: KeptFitFragment) => number | null | undefined): CompareRow => ({
    id,
    kind: 'statistic',
    cells: all.map(({ fit }) => cell(read(fit))),
    change: null,
  });
  const aicc = statistic('aicc', ({ statistics }) => statistics.aicc);
  return [
    ...parameters,
    statistic('tau', ({ statistics }) =>
      statistics.betweenSeriesDeviation == null ? null : 100 * statistics.betweenSeriesDeviation,
    ),
    statistic('chiSquare', ({ statistics }) => statistics.reducedChiSquare),
    { ...aicc, change: comparableAicc(all) ? difference(aicc.cells) : null },
    statistic('series', ({ statistics }) => statistics.seriesCount),
    statistic('points', ({ statistics }) => statistics.pointCount),
    ...at.map((temperature) => diffusivityRow(all, temperature)),
  ];
}

function diffusivityRow(all: readonly Compared[], temperature: number): CompareRow {
  const cells = all.map(({ temperatures, diffusivities, standardUncertainties }) => {
    const i = temperatures.indexOf(temperature);
    return cell(diffusivities[i], standardUncertainties[i], 'm2/s');
  });
  const [first, last] = [cells[0], cells.at(-1)];
  return {
    id: `D ${temperature}`,
    kind: 'diffusivity',
    temperature,
    cells,
    change: first && last ? last.value / first.value - 1 : null,
  };
}

const difference = (cells: readonly (CompareCell | null)[]): number | null => {
  const [first, last] = [cells[0], cells.at(-1)];
  return first && last ? last.value - first.value : null;
};

/** AICc weighs forms against each other only on the same points in the same weights. */
function comparableAicc(all: readonly Compared[]): boolean {
  const key = ({ fit }: Compared) =>
    JSON.stringify([
      fit.objective,
      fit.weighting,
      fit.seriesEffect,
      fit.series.map(({ id }) => id).sort(),
      fit.excludedPoints.map(({ point }) => point.id).sort(),
    ]);
  return new Set(all.map(key)).size === 1;
}

/** The range in T that all fits cover, K; null when they have none in common. */
export function commonRange(fits: readonly KeptFitFragment[]): { readonly low: number; readonly high: number } | null {
  const low = Math.max(...fits.map(({ correlation }) => correlation.validity.temperatureMinimum));
  const high = Math.min(...fits.map(({ correlation }) => correlation.validity.temperatureMaximum));
  return high > low ? { low, high } : null;
}

/** The largest relative difference to the first within the common range, and whether U of the first covers it. */
export function largestDifference(
  [first, ...others]: readonly Compared[],
  range: { readonly low: number; readonly high: number },
) {
  let largest = 0;
  let covered = true;
  first?.temperatures.forEach((T, i) => {
    if (T < range.low || T > range.high) return;
    for (const other of others) {
      const relative = Math.abs(other.diffusivities[i]! / first.diffusivities[i]! - 1);
      largest = Math.max(largest, relative);
      if (relative * first.diffusivities[i]! > first.expandedUncertainties[i]!) covered = false;
    }
  });
  return { largest, covered };
}
