import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { Link } from 'react-router-dom';
import { formatNumber, formatSigned } from '../../lib/format-quantity';
import { paths } from '../../lib/paths';
import { fromSi, type ReaderUnits, unitLabel, useReaderUnits } from '../../lib/units';
import { fitStrings } from '../../strings/fits';
import { SeriesKey } from '../../ui/marks/series-key';
import { Quantity } from '../../ui/numbers/quantity';
import { Typeset } from '../../ui/numbers/typeset';
import { Section } from '../../ui/page/section';
import { ledgerRecipe } from '../../ui/recipes/table.recipe';
import { DataTable, type DataColumn } from '../../ui/table/data-table';
import { type DetailedFit } from './detailed-fit';
import { type PairPoint, type PairSeries } from './pair-series';
import { parseReason } from './reasons';

const words = fitStrings.fitPage;
const ledger = fitStrings.ledger;

/** What the fit was made from: series with their offsets, those left out with the reason, and single points left out. */
export function FitSeriesSection({
  series,
  fit,
}: {
  readonly series: readonly PairSeries[];
  readonly fit: DetailedFit;
}) {
  const units = useReaderUnits();
  return (
    <Section number={4} title={words.offsets} id="series">
      <DataTable
        label={words.offsets}
        columns={columnsOf(units)}
        rows={series}
        rowId={({ id }) => id}
        file={`fit-${fit.number}-series`}
        filterable={false}
        secondLine={({ reason }) => reason !== null && <Why reason={reason} />}
      />
      <PointsLeftOut series={series} fit={fit} />
    </Section>
  );
}

function Why({ reason }: { readonly reason: string }) {
  const styles = useSlotRecipe({ recipe: ledgerRecipe })();
  const { code, words: why } = parseReason(reason);
  return (
    <chakra.div css={styles.reason} paddingBottom="4px" paddingLeft={{ base: 0, md: '22px' }}>
      {code !== null && <b>{fitStrings.reason.codes[code]}</b>}
      {why}
    </chakra.div>
  );
}

function columnsOf(units: ReaderUnits): DataColumn<PairSeries>[] {
  const kelvin = (value: number) => formatNumber(fromSi('temperature', value, units.temperature), 0);
  const unit = unitLabel('temperature', units.temperature);
  const weighted = ({ points }: PairSeries) => points.filter(({ open }) => !open).length;
  return [
    {
      id: 'series',
      head: ledger.series,
      name: ledger.series,
      value: (row) => `${row.letter}, ${row.title}`,
      cell: (row) => (
        <>
          <SeriesKey index={row.mark} open={!row.carriesWeight} />
          {row.letter}, <Link to={paths.series(row.id)}>{row.title}</Link>
        </>
      ),
    },
    {
      id: 'weight',
      head: ledger.weight,
      name: ledger.weight,
      value: (row) => (row.carriesWeight ? ledger.in : ledger.out),
    },
    { id: 'method', head: ledger.method, name: ledger.method, wideOnly: true, value: (row) => row.method },
    {
      id: 'n',
      head: <i>n</i>,
      name: 'n',
      numeric: true,
      wideOnly: true,
      value: weighted,
      cell: (row) =>
        !row.carriesWeight || weighted(row) === row.points.length
          ? row.points.length
          : `${weighted(row)} of ${row.points.length}`,
    },
    {
      id: 'T',
      head: <i>T</i>,
      unit,
      name: `T / ${unit}`,
      numeric: true,
      wideOnly: true,
      value: (row) => row.temperatureMinimum,
      cell: (row) => `${kelvin(row.temperatureMinimum)}–${kelvin(row.temperatureMaximum)}`,
    },
    {
      id: 'stated',
      head: <Typeset>{ledger.stated}</Typeset>,
      unit: '%',
      name: 'stated u / %',
      numeric: true,
      wideOnly: true,
      value: (row) => row.usualUncertainty,
      cell: (row) => formatNumber(100 * row.usualUncertainty, 1),
    },
    {
      id: 'offset',
      head: <Typeset>{ledger.offset}</Typeset>,
      unit: '%',
      name: 'offset / %',
      numeric: true,
      value: (row) => row.offset?.value ?? null,
      cell: (row) =>
        row.offset && `${formatSigned(100 * row.offset.value, 1)} ± ${formatNumber(100 * row.offset.uncertainty, 1)}`,
    },
  ];
}

function PointsLeftOut({ series, fit }: { readonly series: readonly PairSeries[]; readonly fit: DetailedFit }) {
  const reasons = new Map(fit.excludedPoints.map(({ point, reason }) => [point.id, reason]));
  const rows = series.flatMap((one) =>
    one.points.flatMap((point) =>
      reasons.has(point.id) ? [{ ...point, letter: one.letter, reason: reasons.get(point.id) ?? '' }] : [],
    ),
  );
  type Row = PairPoint & { readonly letter: string; readonly reason: string };
  const columns: DataColumn<Row>[] = [
    { id: 'point', head: words.number, name: words.number, value: (row) => `${row.letter} ${row.number}` },
    {
      id: 'T',
      head: <i>T</i>,
      name: 'T / K',
      numeric: true,
      value: (row) => row.temperature,
      cell: (row) => <Quantity kind="temperature" value={row.temperature} />,
    },
    {
      id: 'P',
      head: <i>P</i>,
      name: 'P / Pa',
      numeric: true,
      wideOnly: true,
      value: (row) => row.pressure,
      cell: (row) => <Quantity kind="pressure" value={row.pressure} />,
    },
    {
      id: 'D',
      head: <i>D</i>,
      name: 'D / (m²/s)',
      numeric: true,
      value: (row) => row.diffusivity,
      cell: (row) => <Quantity kind="diffusivity" value={row.diffusivity} uncertainty={row.uncertainty} />,
    },
    {
      id: 'deviation',
      head: words.deviation,
      unit: '%',
      name: 'deviation / %',
      numeric: true,
      value: (row) => row.deviation,
      cell: (row) => row.deviation !== null && formatSigned(100 * row.deviation, 1),
    },
    { id: 'reason', head: words.reason, name: words.reason, value: (row) => row.reason },
  ];
  return (
    <>
      <chakra.h3 textStyle="subsection" margin="24px 0 8px">
        {words.left}
      </chakra.h3>
      {rows.length === 0 ? (
        <chakra.p textStyle="small" color="ink2">
          {words.allIn}
        </chakra.p>
      ) : (
        <DataTable
          label={words.left}
          columns={columns}
          rows={rows}
          rowId={({ id }) => id}
          file={`fit-${fit.number}-points-left-out`}
        />
      )}
    </>
  );
}
