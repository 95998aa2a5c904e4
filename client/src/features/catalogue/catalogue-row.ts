import { type CatalogueQuery } from '../../gql/graphql';

type Sheet = CatalogueQuery['dataSheets']['edges'][number]['node'];

/** A released sheet as it stands in the list; numbers in SI. */
export interface CatalogueRow {
  readonly code: string;
  readonly number: string;
  /** `Ethanol + nitrogen` */
  readonly title: string;
  readonly substances: readonly { readonly name: string; readonly formula: string }[];
  readonly temperatureMinimum: number;
  readonly temperatureMaximum: number;
  readonly pressureMinimum: number;
  readonly pressureMaximum: number;
  /** At 298.15 K and 101 325 Pa; null where that lies outside the range. */
  readonly reference: { readonly diffusivity: number; readonly expandedUncertainty: number } | null;
  readonly exponent: { readonly value: number; readonly standardUncertainty: number | null } | null;
  readonly releasedAt: string | null;
}

export const pairTitle = (substances: readonly { readonly name: string }[]): string => {
  const title = substances.map(({ name }) => name).join(' + ');
  return title.charAt(0).toUpperCase() + title.slice(1);
};

/** The rows of the sheets that have a version in force. */
export function catalogueRows(sheets: readonly Sheet[]): CatalogueRow[] {
  return sheets.flatMap((sheet) => {
    const { current } = sheet;
    if (!current) return [];
    const { evaluate, parameters, validity } = current.correlation;
    const exponent = parameters.find((parameter) => parameter.symbol === 'n');
    const [diffusivity] = evaluate.diffusivities;
    const [expandedUncertainty] = evaluate.expandedUncertainties;
    const known = diffusivity !== undefined && expandedUncertainty !== undefined && evaluate.outside.length === 0;
    return {
      code: sheet.code,
      number: current.number,
      title: pairTitle(sheet.pair.substances),
      substances: sheet.pair.substances,
      ...validity,
      reference: known ? { diffusivity, expandedUncertainty } : null,
      exponent: exponent ? { value: exponent.value, standardUncertainty: exponent.standardUncertainty ?? null } : null,
      releasedAt: current.releasedAt ?? null,
    };
  });
}

const MOST_GASES = 5;

/** Gases that stand in two sheets or more, the most frequent first: what the list can be narrowed to. */
export function commonGases(rows: readonly CatalogueRow[]): string[] {
  const counts = new Map<string, number>();
  for (const { name } of rows.flatMap((row) => row.substances)) counts.set(name, (counts.get(name) ?? 0) + 1);
  return [...counts]
    .filter(([, count]) => count > 1)
    .sort(([a, m], [b, n]) => n - m || a.localeCompare(b))
    .slice(0, MOST_GASES)
    .map(([name]) => name);
}
