import { chakra } from '@chakra-ui/react';
import { type SheetNumbersFragment, type SheetTextFragment } from '../../gql/graphql';
import { formatNumber, formatShort, placesFor } from '../../lib/format-quantity';
import { differenceFromSi, fromSi, type ReaderUnits, unitLabel, useReaderUnits } from '../../lib/units';
import { sheetStrings } from '../../strings/sheets';
import { Aligned, mostPlaces } from '../../ui/numbers/aligned';
import { Unit } from '../../ui/numbers/num';
import { Runs } from '../../ui/numbers/typeset';
import { MarginBlock } from '../../ui/page/margin-block';
import { Section } from '../../ui/page/section';
import { DataTable, type DataColumn } from '../../ui/table/data-table';
import { Paragraphs } from './paragraphs';

interface RecommendedSectionProps {
  readonly number: number;
  readonly title: string;
  readonly content: SheetTextFragment & SheetNumbersFragment;
  readonly file: string;
}

/** A row as printed, in the reader's units, and its numbers for sorting and copies. */
interface Row {
  readonly temperature: number;
  readonly printed: Readonly<Record<Printed, string>>;
  readonly isReference: boolean;
}
type Printed = 'temperature' | 'celsius' | 'value' | 'standard' | 'expanded' | 'relative' | 'newLaboratory';

/** Recommended values over the range, at the reference pressure. */
export function RecommendedSection({ number, title, content, file }: RecommendedSectionProps) {
  const units = useReaderUnits();
  const rows = rowsOf(content.recommended, units);
  return (
    <Section
      number={number}
      title={title}
      id="recommended"
      margin={
        <>
          <MarginBlock title={sheetStrings.margin.uncertainty}>
            <Paragraphs paragraphs={content.uncertainty.statement} />
          </MarginBlock>
        </>
      }
    >
      <chakra.p textStyle="small" color="ink2" marginBottom="16px">
        <Runs runs={content.recommended.note} />
      </chakra.p>
      <DataTable
        label={sheetStrings.recommended.label}
        columns={columnsOf(rows, units, content.recommended.newLaboratoryHalfWidths !== null)}
        rows={rows}
        rowId={(row) => String(row.temperature)}
        file={`${file}-recommended`}
        filterable={false}
        emphasised={(row) => row.isReference}
      />
    </Section>
  );
}

/** In tables m²/s is scaled by 10⁻⁶, so that its figures can be read. */
const tableScale = (units: ReaderUnits) =>
  units.diffusivity === 'm2_s' ? { factor: 1e6, prefix: '10⁻⁶ ' } : { factor: 1, prefix: '' };

function rowsOf(recommended: SheetNumbersFragment['recommended'], units: ReaderUnits): Row[] {
  const { factor } = tableScale(units);
  return recommended.temperatures.map((temperature, i) => {
    const value = fromSi('diffusivity', recommended.diffusivities[i]!, units.diffusivity) * factor;
    const uncertainty = (si: number) => differenceFromSi('diffusivity', si, units.diffusivity) * factor;
    const standard = uncertainty(recommended.standardUncertainties[i]!);
    const expanded = uncertainty(recommended.expandedUncertainties[i]!);
    const half = recommended.newLaboratoryHalfWidths?.[i];
    const twoDigits = (u: number) => formatNumber(u, placesFor(u));
    return {
      temperature,
      isReference: i === recommended.referenceRow,
      printed: {
        temperature: formatShort(fromSi('temperature', temperature, units.temperature)),
        celsius: formatShort(fromSi('temperature', temperature, 'degC')),
        value: formatNumber(value, placesFor(standard)),
        standard: twoDigits(standard),
        expanded: twoDigits(expanded),
        relative: formatNumber((100 * expanded) / value, 1),
        newLaboratory: half === undefined ? '' : twoDigits(uncertainty(half)),
      },
    };
  });
}

function columnsOf(rows: readonly Row[], units: ReaderUnits, predicts: boolean): DataColumn<Row>[] {
  const unit = tableScale(units).prefix + unitLabel('diffusivity', units.diffusivity);
  const temperatureUnit = unitLabel('temperature', units.temperature);
  const column = (
    id: Printed,
    head: DataColumn<Row>['head'],
    columnUnit: string,
    name: string,
    wideOnly = false,
  ): DataColumn<Row> => {
    const places = mostPlaces(rows.map((row) => row.printed[id]));
    return {
      id,
      head,
      unit: <Unit>{columnUnit}</Unit>,
      name: `${name} / ${columnUnit}`,
      numeric: true,
      wideOnly,
      value: (row) => Number(row.printed[id].replace('−', '-').replaceAll('\u2009', '')),
      cell: (row) => <Aligned places={places}>{row.printed[id]}</Aligned>,
    };
  };
  const of = (symbol: string) => (
    <>
      <i>{symbol}</i>(<i>D</i>)
    </>
  );
  return [
    column('temperature', <i>T</i>, temperatureUnit, 'T'),
    ...(units.temperature === 'K' ? [column('celsius', <i>t</i>, '°C', 't', true)] : []),
    column('value', <i>D</i>, unit, 'D'),
    column('standard', of('u'), unit, 'u(D)', true),
    column('expanded', of('U'), unit, 'U(D)'),
    column(
      'relative',
      <>
        <i>U</i>/<i>D</i>
      </>,
      '%',
      'U/D',
    ),
    ...(predicts
      ? [
          column(
            'newLaboratory',
            sheetStrings.recommended.newLaboratory,
            `± ${unit}`,
            sheetStrings.recommended.newLaboratory,
            true,
          ),
        ]
      : []),
  ];
}
