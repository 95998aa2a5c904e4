import { Text, View } from '@react-pdf/renderer';
import {
  PRINTED_UNITS,
  formatNumber,
  formatQuantity,
  formatShort,
  formatSigned,
  formatSignificant,
  formatUncertainty,
  inPrintedUnit,
  placesFor,
} from '../format-quantity.js';
import type { SheetContent, SheetSeries } from '../sheet-content.types.js';
import { sheetStrings } from '../sheet-strings.js';
import { plain, typeset } from '../typeset.js';
import { SeriesMarkKey, StateMark } from './marks.js';
import { PrintTable, type PrintColumn, type PrintRow } from './print-table.js';

const { columns } = sheetStrings;
const DIFFUSIVITY_UNIT = PRINTED_UNITS.diffusivity.symbol;

const numeric = (head: string, unit: string, share: number): PrintColumn => ({
  head: typeset(head),
  unit,
  width: { share },
  isNumeric: true,
});
const words = (head: string, width: PrintColumn['width']): PrintColumn => ({
  head: typeset(head),
  unit: '',
  width,
  isNumeric: false,
});

/** Recommended values: D to the place of its u, u and U to two significant digits. */
export function RecommendedTable({ content }: { readonly content: SheetContent }) {
  const { recommended } = content;
  const widths = recommended.newLaboratoryHalfWidths;
  const table: PrintColumn[] = [
    numeric(columns.temperature, 'K', 1),
    numeric(columns.celsius, PRINTED_UNITS.celsius.symbol, 1),
    numeric(columns.diffusivity, DIFFUSIVITY_UNIT, 1.2),
    numeric(columns.standardUncertainty, DIFFUSIVITY_UNIT, 1.15),
    numeric(columns.expandedUncertainty, DIFFUSIVITY_UNIT, 1.1),
    numeric(columns.relative, '%', 0.8),
    ...(widths === null ? [] : [numeric(columns.newLaboratory, `± ${DIFFUSIVITY_UNIT}`, 1.7)]),
  ];
  const places = placesOf(recommended.temperatures);
  const rows = recommended.temperatures.map((T, i): PrintRow => {
    const [D, u, U] = [
      recommended.diffusivities,
      recommended.standardUncertainties,
      recommended.expandedUncertainties,
    ].map((column) => inPrintedUnit('diffusivity', column[i] ?? Number.NaN)) as [number, number, number];
    const width = widths?.[i];
    return {
      isStrong: i === recommended.referenceRow,
      cells: [
        formatNumber(T, places),
        formatNumber(inPrintedUnit('celsius', T), places),
        formatNumber(D, placesFor(u)),
        formatUncertainty(u),
        formatUncertainty(U),
        formatNumber((100 * U) / D, 1),
        ...(width === undefined ? [] : [formatUncertainty(inPrintedUnit('diffusivity', width))]),
      ],
    };
  });
  return <PrintTable columns={table} rows={rows} isLong />;
}

/** Decimal places that print every value of a column whole, so that its points stand below each other. */
const placesOf = (values: readonly number[]): number =>
  Math.max(0, ...values.map((value) => formatShort(value, 8).split('.')[1]?.length ?? 0));

/** Series used, then left out, each of these with its reason. */
export function SeriesTable({ content }: { readonly content: SheetContent }) {
  const table: PrintColumn[] = [
    { head: [], unit: '', width: { points: 26 }, isNumeric: false },
    words(columns.source, { share: 2.5 }),
    words(columns.method, { share: 2 }),
    numeric(columns.count, '', 0.5),
    numeric(columns.temperature, 'K', 1.55),
    numeric(columns.statedUncertainty, '%', 0.9),
    numeric(columns.offset, '%', 1.25),
  ];
  const leftOut = content.seriesLeftOut.map(seriesRow);
  return (
    <PrintTable
      columns={table}
      rows={content.seriesUsed.map(seriesRow)}
      more={leftOut.length === 0 ? [] : [{ title: sheetStrings.leftOut, rows: leftOut }]}
    />
  );
}

function seriesRow(series: SheetSeries): PrintRow {
  const u = series.relativeUncertainty;
  const stated = u === null ? '–' : formatNumber(100 * u, 1) + (series.uncertaintyAssigned ? '*' : '');
  const count =
    series.weightedPointCount === series.pointCount || series.reason !== null
      ? String(series.pointCount)
      : `${series.weightedPointCount}/${series.pointCount}`;
  const extent = `${formatNumber(series.temperatureMinimum, 0)} to ${formatNumber(series.temperatureMaximum, 0)}`;
  return {
    cells: [
      <View key="mark" style={{ flexDirection: 'row', alignItems: 'center' }}>
        <SeriesMarkKey mark={series.mark} isOpen={series.reason !== null} />
        <Text style={{ marginLeft: 5 }}>{series.key}</Text>
      </View>,
      series.title,
      series.method,
      count,
      extent,
      stated,
      offsetOf(series),
    ],
    ...(series.reason === null ? {} : { note: series.reason }),
  };
}

function offsetOf({ offset, offsetStandardUncertainty: u }: SheetSeries): string {
  if (offset === null) return '–';
  const shown = formatSigned(100 * offset, 1);
  return u === null ? shown : `${shown} ± ${formatNumber(100 * u, 1)}`;
}

/** Single points left out of series that were used. */
export function ExcludedPointsTable({ content }: { readonly content: SheetContent }) {
  const table: PrintColumn[] = [
    words(columns.point, { points: 34 }),
    numeric(columns.temperature, 'K', 1),
    numeric('*P*', PRINTED_UNITS.pressure.symbol, 1),
    numeric(columns.diffusivity, DIFFUSIVITY_UNIT, 1.1),
    numeric(columns.deviation, '%', 1),
    words(columns.reason, { share: 5 }),
  ];
  const rows = content.pointsLeftOut.map(
    ({ seriesKey, temperature, pressure, diffusivity, deviation, reason }): PrintRow => ({
      cells: [
        seriesKey,
        formatShort(temperature),
        formatShort(inPrintedUnit('pressure', pressure)),
        formatSignificant(inPrintedUnit('diffusivity', diffusivity), 4),
        formatSigned(deviation, 1),
        reason,
      ],
    }),
  );
  return <PrintTable columns={table} rows={rows} />;
}

/** Estimates at two temperatures beside the fit, with their usual error. */
export function EstimatesTable({ content }: { readonly content: SheetContent }) {
  const { estimates } = content;
  const table: PrintColumn[] = [
    words(columns.estimate, { share: 2.4 }),
    ...estimates.temperatures.flatMap((T) => [
      {
        ...numeric('', DIFFUSIVITY_UNIT, 1.4),
        head: typeset(columns.diffusivityAt, { temperature: formatQuantity('temperature', T) }),
      },
      numeric(columns.againstFit, '%', 1.1),
    ]),
    numeric(columns.usualError, '%', 1.1),
  ];
  const rows = estimates.methods.map(({ method, diffusivities, deviations, usualMeanError }): PrintRow => ({
    cells: [
      method,
      ...diffusivities.flatMap((D, i) => [
        // An estimate has no uncertainty of its own; four digits are more than it deserves.
        formatSignificant(inPrintedUnit('diffusivity', D), 4),
        formatSigned(deviations[i] ?? Number.NaN, 1),
      ]),
      formatShort(usualMeanError, 2),
    ],
  }));
  return <PrintTable columns={table} rows={rows} />;
}

export function VersionsTable({ content }: { readonly content: SheetContent }) {
  const table: PrintColumn[] = [
    words(columns.version, { points: 42 }),
    words(columns.state, { points: 74 }),
    words(columns.date, { points: 84 }),
    words(columns.change, { share: 1 }),
  ];
  const rows = content.versions.map(({ number, status, word, datePrinted, change, isThis }): PrintRow => ({
    isStrong: isThis,
    cells: [
      number,
      <StateMark key="state" status={status} word={word} />,
      datePrinted,
      <Text key="change" style={{ fontWeight: 400 }}>
        {change}
      </Text>,
    ],
  }));
  return <PrintTable columns={table} rows={rows} />;
}

/** What the star at an uncertainty means; nothing where there is none. */
export const assignedNote = ({ seriesUsed, seriesLeftOut }: SheetContent) =>
  [...seriesUsed, ...seriesLeftOut].some((series) => series.uncertaintyAssigned)
    ? plain(sheetStrings.assignedMark)
    : null;
