import { type SubstanceFieldsFragment } from '../../gql/graphql';
import { formatNumber, formatShort, placesFor } from '../../lib/format-quantity';
import { substanceStrings } from '../../strings/substances';
import { Num, Unit } from '../../ui/numbers/num';
import { QuantityRange } from '../../ui/numbers/quantity';
import { Typeset } from '../../ui/numbers/typeset';
import { DataTable, type DataColumn } from '../../ui/table/data-table';
import { printedUnit } from './constant-units';

const words = substanceStrings.detail;
type Constant = SubstanceFieldsFragment['constants'][number];

/** `p_sat` as it is set: the label below the line. */
const symbolMarkup = (symbol: string): string => {
  const [base = '', label] = symbol.split('_');
  return label === undefined ? `*${base}*` : `*${base}*_{${label}}`;
};

const named: DataColumn<Constant> = {
  id: 'label',
  head: words.columns.constant,
  name: words.columns.constant,
  value: (row) => row.label,
};
const symbol: DataColumn<Constant> = {
  id: 'symbol',
  head: words.columns.symbol,
  name: words.columns.symbol,
  wideOnly: true,
  sortable: false,
  value: (row) => row.symbol,
  cell: (row) => <Typeset>{symbolMarkup(row.symbol)}</Typeset>,
};
const holds: DataColumn<Constant> = {
  id: 'holds',
  head: words.columns.holds,
  name: 'holds from / K',
  wideOnly: true,
  value: (row) => row.temperatureMinimum ?? null,
  cell: (row) =>
    row.temperatureMinimum != null && row.temperatureMaximum != null ? (
      <QuantityRange kind="temperature" low={row.temperatureMinimum} high={row.temperatureMaximum} />
    ) : (
      ''
    ),
};
const uncertainty: DataColumn<Constant> = {
  id: 'u',
  head: <Typeset>{words.columns.uncertainty}</Typeset>,
  name: 'u / %',
  numeric: true,
  value: (row) => (row.relativeUncertainty == null ? null : 100 * row.relativeUncertainty),
  cell: (row) =>
    row.relativeUncertainty == null
      ? ''
      : `${formatNumber(100 * row.relativeUncertainty, placesFor(100 * row.relativeUncertainty))}\u00a0%`,
};
const unit: DataColumn<Constant> = {
  id: 'unit',
  head: words.columns.unit,
  name: words.columns.unit,
  sortable: false,
  value: (row) => printedUnit(row.unit),
  cell: (row) => <Unit>{printedUnit(row.unit)}</Unit>,
};
const source: DataColumn<Constant> = {
  id: 'source',
  head: words.columns.source,
  name: words.columns.source,
  value: (row) => row.source,
  cell: (row) => (
    <>
      {row.source}
      {row.note && `. ${row.note}`}
    </>
  ),
};
const value: DataColumn<Constant> = {
  id: 'value',
  head: words.columns.value,
  name: words.columns.value,
  numeric: true,
  value: (row) => row.value ?? null,
  cell: (row) => formatShort(row.value ?? NaN, 7),
};

interface TableProps {
  readonly file: string;
}

const rowId = (constant: Constant): string => `${constant.kind} ${constant.form ?? ''} ${constant.source}`;

/** Constants that are one number. */
export const ConstantsTable = ({ constants, file }: TableProps & { readonly constants: readonly Constant[] }) => (
  <DataTable
    label={words.constants}
    columns={[named, symbol, value, uncertainty, unit, holds, source]}
    rows={constants}
    rowId={rowId}
    file={file}
  />
);

/** Equations in temperature with their coefficients; of several of one kind the first is the one in use. */
export const EquationsTable = ({ equations, file }: TableProps & { readonly equations: readonly Constant[] }) => (
  <>
    <DataTable
      label={words.equationsTitle}
      columns={[named, symbol, form, coefficients, uncertainty, unit, holds, source]}
      rows={equations}
      rowId={rowId}
      file={file}
    />
    <p>{words.si}</p>
  </>
);

const form: DataColumn<Constant> = {
  id: 'form',
  head: words.equation,
  name: words.equation,
  value: (row) => formName(row.form ?? ''),
};

const formName = (name: string): string => (name.charAt(0) + name.slice(1).toLowerCase()).replace('_', ' ');

const coefficients: DataColumn<Constant> = {
  id: 'coefficients',
  head: words.coefficients,
  name: words.coefficients,
  sortable: false,
  wideOnly: true,
  value: (row) => row.coefficients.map(({ symbol: name, value: number }) => `${name} = ${number}`).join('; '),
  cell: (row) => (
    <>
      {row.coefficients.map(({ symbol: name, value: number }) => (
        <div key={name}>
          <Num>{`${name} = ${formatPlain(number)}`}</Num>
        </div>
      ))}
    </>
  ),
};

/** All its digits: a coefficient is exact as its source prints it. */
const formatPlain = (number: number): string => String(number).replace('-', '−').replace('e', ' × 10^');
