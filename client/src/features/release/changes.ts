/** D of two versions at one temperature, SI. */
export interface ChangeRow {
  readonly temperature: number;
  readonly current: { readonly value: number; readonly uncertainty: number };
  readonly next: { readonly value: number; readonly uncertainty: number };
  /** Relative. */
  readonly change: number;
  /** In the older U. */
  readonly inOlderU: number;
}

interface Values {
  readonly diffusivities: readonly number[];
  readonly standardUncertainties: readonly number[];
  readonly expandedUncertainties: readonly number[];
}

/** What changes for readers, at each of the temperatures. */
export function changeRows(temperatures: readonly number[], current: Values, next: Values): ChangeRow[] {
  return temperatures.flatMap((temperature, i) => {
    const [before, after, olderU] = [current.diffusivities[i], next.diffusivities[i], current.expandedUncertainties[i]];
    if (before === undefined || after === undefined || olderU === undefined) return [];
    return [
      {
        temperature,
        current: { value: before, uncertainty: current.standardUncertainties[i] ?? 0 },
        next: { value: after, uncertainty: next.standardUncertainties[i] ?? 0 },
        change: after / before - 1,
        inOlderU: Math.abs(after - before) / olderU,
      },
    ];
  });
}

/** The row that changes most; null where there is none. */
export const largestChange = (rows: readonly ChangeRow[]): ChangeRow | null =>
  rows.reduce<ChangeRow | null>(
    (most, row) => (most === null || Math.abs(row.change) > Math.abs(most.change) ? row : most),
    null,
  );

const edition = (number: string): string => number.split('.')[0] ?? number;

/** A new edition changes a recommended value, its uncertainty or its range; a revision changes words. */
export const isNewEdition = (number: string, current: string): boolean => edition(number) !== edition(current);
