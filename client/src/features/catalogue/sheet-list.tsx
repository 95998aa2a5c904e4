import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { Link } from 'react-router-dom';
import { useEdition } from '../../lib/edition';
import { formatShort, formatShortDate } from '../../lib/format-quantity';
import { paths } from '../../lib/paths';
import { differenceFromSi, fromSi, type ReaderUnits, unitLabel, useReaderUnits } from '../../lib/units';
import { catalogueStrings } from '../../strings/catalogue';
import { readerTicks } from '../../ui/figure/ticks';
import { ExtentRule, ExtentScale } from '../../ui/marks/temperature-rule';
import { Concise, Unit } from '../../ui/numbers/num';
import { rangeText } from '../../ui/numbers/quantity';
import { Formula, Typeset } from '../../ui/numbers/typeset';
import { sheetListRecipe } from '../../ui/recipes/table.recipe';
import { DataTable, type DataColumn } from '../../ui/table/data-table';
import { type CatalogueRow } from './catalogue-row';

const words = catalogueStrings.columns;

interface SheetListProps {
  readonly rows: readonly CatalogueRow[];
  /** Of the address of each sheet: the state asked for. */
  readonly state: string;
}

/** The scale of all extents, K. Longer ranges run on beyond it, with an arrow. */
const SCALE = { from: 240, to: 500 };

/** Released sheets, one a row: pair, extent on a common scale, T, P, D0(U), n(u), version, date. */
export function SheetList({ rows, state }: SheetListProps) {
  const styles = useSlotRecipe({ recipe: sheetListRecipe })();
  const units = useReaderUnits();
  return (
    <chakra.div css={styles.root}>
      <DataTable
        label={catalogueStrings.section}
        columns={useColumns(units, state)}
        rows={rows}
        rowId={(row) => row.code}
        file="diffolio-sheets"
        filterable={false}
      />
    </chakra.div>
  );
}

function useColumns(units: ReaderUnits, state: string): DataColumn<CatalogueRow>[] {
  const edition = useEdition();
  const kelvin = (value: number, digits = 4) => formatShort(fromSi('temperature', value, units.temperature), digits);
  const pascal = (value: number) => formatShort(fromSi('pressure', value, units.pressure), 4);
  const temperature = unitLabel('temperature', units.temperature);
  const pressure = unitLabel('pressure', units.pressure);
  const diffusivity = unitLabel('diffusivity', units.diffusivity);
  const ticks = readerTicks('temperature', { min: SCALE.from, max: SCALE.to }, units.temperature, 3);
  return [
    {
      id: 'pair',
      head: words.pair,
      name: words.pair,
      className: 'pair',
      value: (row) => row.title,
      cell: (row) => <Pair row={row} state={state} />,
    },
    {
      id: 'extent',
      head: <Typeset>{words.extent}</Typeset>,
      unit: <ExtentScale {...SCALE} ticks={ticks} format={(t) => kelvin(t)} />,
      name: 'range',
      sortable: false,
      className: 'rule',
      value: () => null,
      cell: (row) => (
        <ExtentRule
          low={row.temperatureMinimum}
          high={row.temperatureMaximum}
          {...SCALE}
          edition={edition}
          label={rangeText('temperature', row.temperatureMinimum, row.temperatureMaximum, units.temperature)}
        />
      ),
    },
    {
      id: 'T',
      head: <i>T</i>,
      unit: temperature,
      name: `T / ${temperature}`,
      numeric: true,
      className: 'extent',
      value: (row) => row.temperatureMinimum,
      cell: (row) => `${kelvin(row.temperatureMinimum)} to ${kelvin(row.temperatureMaximum)}`,
    },
    {
      id: 'P',
      head: <i>P</i>,
      unit: pressure,
      name: `P / ${pressure}`,
      numeric: true,
      className: 'side',
      value: (row) => row.pressureMinimum,
      cell: (row) => `${pascal(row.pressureMinimum)} to ${pascal(row.pressureMaximum)}`,
    },
    {
      id: 'D0',
      head: <Typeset>{words.d0}</Typeset>,
      unit: <Unit>{diffusivity}</Unit>,
      name: `D0(U) / (${diffusivity})`,
      numeric: true,
      className: 'value',
      value: (row) => (row.reference ? fromSi('diffusivity', row.reference.diffusivity, units.diffusivity) : null),
      cell: ({ reference }) =>
        reference ? (
          <Concise
            value={fromSi('diffusivity', reference.diffusivity, units.diffusivity)}
            uncertainty={differenceFromSi('diffusivity', reference.expandedUncertainty, units.diffusivity)}
          />
        ) : (
          <span title={catalogueStrings.outsideReference}>–</span>
        ),
    },
    {
      id: 'n',
      head: <Typeset>{words.n}</Typeset>,
      name: 'n(u)',
      numeric: true,
      className: 'side',
      value: (row) => row.exponent?.value ?? null,
      cell: ({ exponent }) =>
        exponent ? <Concise value={exponent.value} uncertainty={exponent.standardUncertainty ?? 0} /> : '',
    },
    {
      id: 'version',
      head: words.version,
      name: words.version,
      numeric: true,
      className: 'version',
      value: (row) => row.number,
    },
    {
      id: 'released',
      head: words.released,
      name: words.released,
      numeric: true,
      className: 'side',
      value: (row) => row.releasedAt ?? '',
      cell: (row) => (row.releasedAt ? formatShortDate(row.releasedAt) : ''),
    },
  ];
}

const Pair = ({ row, state }: { readonly row: CatalogueRow; readonly state: string }) => (
  <>
    <Link to={paths.version(row.code, row.number) + state}>{row.title}</Link>{' '}
    <span className="formula">
      <Formula>{row.substances.map(({ formula }) => formula).join(' + ')}</Formula>
    </span>
  </>
);
