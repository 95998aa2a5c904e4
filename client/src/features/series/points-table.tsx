import { type SeriesDetailFragment } from '../../gql/graphql';
import { formatNumber, formatShort, placesFor } from '../../lib/format-quantity';
import { differenceFromSi, fromSi, type ReaderUnits, unitLabel, useReaderUnits, type Quantity } from '../../lib/units';
import { seriesStrings } from '../../strings/series';
import { Aligned, mostPlaces } from '../../ui/numbers/aligned';
import { Unit } from '../../ui/numbers/num';
import { Typeset } from '../../ui/numbers/typeset';
import { DataTable, type DataColumn } from '../../ui/table/data-table';

const words = seriesStrings.table;
type Point = SeriesDetailFragment['points'][number];
type Row = Point & { readonly number: number };

/** The points as they are kept, in the reader's units. */
export function PointsTable({ series }: { readonly series: SeriesDetailFragment }) {
  const units = useReaderUnits();
  const rows = series.points.map((point, i) => ({ ...point, number: i + 1 }));
  return (
    <DataTable
      label={words.title}
      columns={columnsOf(rows, units)}
      rows={rows}
      rowId={({ id }) => id}
      file={`series-${series.title}`}
    />
  );
}

function columnsOf(rows: readonly Row[], units: ReaderUnits): DataColumn<Row>[] {
  const has = (read: (row: Row) => unknown) => rows.some((row) => read(row) != null);
  const column = <Q extends Quantity>(
    id: string,
    symbol: string,
    quantity: Q,
    read: (row: Row) => number,
  ): DataColumn<Row> => {
    const texts = rows.map((row) => formatShort(fromSi(quantity, read(row), units[quantity]), 7));
    const places = mostPlaces(texts);
    const unit = unitLabel(quantity, units[quantity]);
    return {
      id,
      head: <i>{symbol}</i>,
      unit: <Unit>{unit}</Unit>,
      name: `${symbol} / ${unit}`,
      numeric: true,
      value: (row) => fromSi(quantity, read(row), units[quantity]),
      cell: (row) => <Aligned places={places}>{formatShort(fromSi(quantity, read(row), units[quantity]), 7)}</Aligned>,
    };
  };
  const uncertainty = <Q extends Quantity>(
    id: string,
    symbol: string,
    quantity: Q,
    read: (row: Row) => number | null | undefined,
  ): DataColumn<Row> => {
    const printed = (row: Row) => {
      const u = read(row);
      if (u == null) return '';
      const inUnit = differenceFromSi(quantity, u, units[quantity]);
      return formatNumber(inUnit, Math.max(0, placesFor(inUnit)));
    };
    const places = mostPlaces(rows.map(printed));
    const unit = unitLabel(quantity, units[quantity]);
    return {
      id,
      head: <Typeset>{`*u*(*${symbol}*)`}</Typeset>,
      unit: <Unit>{unit}</Unit>,
      name: `u(${symbol}) / ${unit}`,
      numeric: true,
      wideOnly: symbol !== 'D',
      value: (row) => (read(row) == null ? null : differenceFromSi(quantity, read(row) ?? 0, units[quantity])),
      cell: (row) => (printed(row) === '' ? words.notStated : <Aligned places={places}>{printed(row)}</Aligned>),
    };
  };
  return [
    { id: 'number', head: words.number, name: words.number, numeric: true, value: ({ number }) => number },
    column('T', 'T', 'temperature', ({ temperature }) => temperature),
    ...(has((row) => row.temperatureUncertainty)
      ? [uncertainty('uT', 'T', 'temperature', (row) => row.temperatureUncertainty)]
      : []),
    column('P', 'P', 'pressure', ({ pressure }) => pressure),
    ...(has((row) => row.pressureUncertainty)
      ? [uncertainty('uP', 'P', 'pressure', (row) => row.pressureUncertainty)]
      : []),
    ...(rows.some(({ pressureOrigin }) => pressureOrigin !== 'STATED')
      ? [
          {
            id: 'pressureOrigin',
            head: <Typeset>{words.pressureOrigin}</Typeset>,
            name: 'P is',
            wideOnly: true,
            value: (row: Row) => seriesStrings.pressureOrigins[row.pressureOrigin],
          },
        ]
      : []),
    column('D', 'D', 'diffusivity', ({ diffusivity }) => diffusivity),
    uncertainty('uD', 'D', 'diffusivity', (row) => row.diffusivityUncertainty),
    {
      id: 'uncertaintyOrigin',
      head: <Typeset>{words.uncertaintyOrigin}</Typeset>,
      name: 'u(D) is',
      wideOnly: true,
      value: ({ uncertaintyOrigin }) =>
        uncertaintyOrigin === 'ASSIGNED'
          ? words.assigned
          : uncertaintyOrigin === 'STATED'
            ? words.stated
            : words.notStated,
    },
    ...(has((row) => row.moleFraction)
      ? [
          {
            id: 'x',
            head: <Typeset>{words.moleFraction}</Typeset>,
            name: 'x1',
            numeric: true,
            wideOnly: true,
            value: (row: Row) => row.moleFraction ?? null,
          },
        ]
      : []),
    ...(has((row) => row.replicates)
      ? [
          {
            id: 'replicates',
            head: words.replicates,
            name: words.replicates,
            numeric: true,
            wideOnly: true,
            value: (row: Row) => row.replicates ?? null,
          },
        ]
      : []),
  ];
}
