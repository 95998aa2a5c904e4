import { chakra } from '@chakra-ui/react';
import { type ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { fill } from '../../lib/fill';
import { formatNumber, formatShort, formatSigned, withUnit } from '../../lib/format-quantity';
import { paths } from '../../lib/paths';
import { differenceFromSi, fromSi, type ReaderUnits, unitLabel, useReaderUnits } from '../../lib/units';
import { fitStrings } from '../../strings/fits';
import { Concise, Num, Unit } from '../../ui/numbers/num';
import { Typeset } from '../../ui/numbers/typeset';
import { DataTable, type DataColumn } from '../../ui/table/data-table';
import { fitName } from './compare-figure';
import { compareRows, type Compared, type CompareCell, type CompareRow } from './compare-rows';
import { ParameterSymbol } from './parameter';
import { pressureWords } from './workspace-figure';

const words = fitStrings.compare;

interface CompareTableProps {
  readonly compared: readonly [Compared, ...Compared[]];
  readonly at: readonly number[];
  readonly pressure: number;
  readonly file: string;
}

/** One quantity a row, one fit a column; the last against the first. */
export function CompareTable({ compared, at, pressure, file }: CompareTableProps) {
  const units = useReaderUnits();
  const rows = compareRows(compared, at);
  const [first] = compared;
  const last = compared.at(-1) ?? first;
  const against = fill(words.against, { a: first.fit.number, b: last.fit.number });
  const columns: DataColumn<CompareRow>[] = [
    {
      id: 'quantity',
      head: words.quantity,
      name: words.quantity,
      sortable: false,
      value: (row) => row.id,
      cell: (row) => <QuantityName row={row} units={units} />,
    },
    ...compared.map((one, i): DataColumn<CompareRow> => ({
      id: one.fit.id,
      head: <Link to={paths.fit(one.fit.id)}>{fill(fitStrings.fitTitle, { number: one.fit.number })}</Link>,
      unit: fitStrings.recipe.allForms[one.fit.correlation.form],
      name: fitName(one),
      numeric: true,
      sortable: false,
      value: (row) => row.cells[i]?.value ?? null,
      cell: (row) => <CellValue row={row} cell={row.cells[i] ?? null} units={units} />,
    })),
    {
      id: 'change',
      head: against,
      name: against,
      numeric: true,
      sortable: false,
      value: (row) => row.change,
      cell: (row) => <chakra.span color="ink2">{changeText(row)}</chakra.span>,
    },
  ];
  return (
    <DataTable
      label={words.label}
      columns={columns}
      rows={rows}
      rowId={(row) => row.id}
      file={file}
      filterable={false}
      tools={
        <span>
          <i>P</i> = {pressureWords(pressure, units)}
        </span>
      }
    />
  );
}

function changeText(row: CompareRow): string {
  if (row.change === null) return '';
  return row.kind === 'diffusivity' ? `${formatSigned(100 * row.change, 2)}\u00a0%` : formatSigned(row.change, 1);
}

const STATISTICS: Readonly<Record<string, ReactNode>> = {
  tau: <Typeset>*τ* / %</Typeset>,
  chiSquare: <Typeset>{fitStrings.result.chiSquare}</Typeset>,
  aicc: 'AICc',
  series: words.series,
  points: words.points,
};

function QuantityName({ row, units }: { readonly row: CompareRow; readonly units: ReaderUnits }) {
  if (row.kind === 'statistic') return <>{STATISTICS[row.id]}</>;
  if (row.kind === 'diffusivity') {
    const temperature = withUnit(
      formatShort(fromSi('temperature', row.temperature ?? NaN, units.temperature), 5),
      unitLabel('temperature', units.temperature),
    );
    return (
      <chakra.span whiteSpace="nowrap">
        <i>D</i>({temperature}) / (<Unit>{unitLabel('diffusivity', units.diffusivity)}</Unit>)
      </chakra.span>
    );
  }
  const unit = row.cells.find((cell) => cell !== null)?.unit;
  return (
    <chakra.span whiteSpace="nowrap">
      <ParameterSymbol symbol={row.id} />
      {unit === 'm2/s' && (
        <>
          {' / ('}
          <Unit>{unitLabel('diffusivity', units.diffusivity)}</Unit>)
        </>
      )}
    </chakra.span>
  );
}

const PLACES: Readonly<Record<string, number>> = { tau: 2, chiSquare: 2, aicc: 1, series: 0, points: 0 };

function CellValue({
  row,
  cell,
  units,
}: {
  readonly row: CompareRow;
  readonly cell: CompareCell | null;
  readonly units: ReaderUnits;
}) {
  if (cell === null) return <>–</>;
  if (row.kind === 'statistic') return <Num>{formatNumber(cell.value, PLACES[row.id] ?? 0)}</Num>;
  const inUnit = (value: number, convert: typeof fromSi<'diffusivity'>) =>
    cell.unit === 'm2/s' ? convert('diffusivity', value, units.diffusivity) : value;
  const value = inUnit(cell.value, fromSi);
  if (cell.uncertainty === null) return <Num>{formatShort(value)}</Num>;
  return <Concise value={value} uncertainty={inUnit(cell.uncertainty, differenceFromSi)} />;
}
