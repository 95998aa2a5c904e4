import { type SheetNumbersFragment } from '../../gql/graphql';
import { formatNumber, formatSigned, formatShort } from '../../lib/format-quantity';
import { fromSi, type ReaderUnits, unitLabel, useReaderUnits } from '../../lib/units';
import { sheetStrings } from '../../strings/sheets';
import { Unit } from '../../ui/numbers/num';
import { Runs } from '../../ui/numbers/typeset';
import { MarginBlock } from '../../ui/page/margin-block';
import { Section } from '../../ui/page/section';
import { DataTable, type DataColumn } from '../../ui/table/data-table';

const words = sheetStrings.estimates;
type Estimates = SheetNumbersFragment['estimates'];
type Method = Estimates['methods'][number];

interface EstimatesSectionProps {
  readonly number: number;
  readonly title: string;
  readonly estimates: Estimates;
  readonly file: string;
}

/** Estimates beside the recommended values; none took part in the fit. */
export function EstimatesSection({ number, title, estimates, file }: EstimatesSectionProps) {
  const units = useReaderUnits();
  return (
    <Section
      number={number}
      title={title}
      id="estimates"
      margin={
        <MarginBlock>
          <p>
            <Runs runs={estimates.note} />
          </p>
          {[...new Set(estimates.methods.map((method) => method.source))].map((source) => (
            <p key={source}>{source}</p>
          ))}
        </MarginBlock>
      }
    >
      <DataTable
        label={words.label}
        columns={columnsOf(estimates, units)}
        rows={estimates.methods}
        rowId={(row) => row.method}
        file={`${file}-estimates`}
      />
    </Section>
  );
}

function columnsOf(estimates: Estimates, units: ReaderUnits): DataColumn<Method>[] {
  const scale = units.diffusivity === 'm2_s' ? 1e6 : 1;
  const unit = (scale === 1 ? '' : '10⁻⁶ ') + unitLabel('diffusivity', units.diffusivity);
  const at = (kelvin: number) =>
    `${formatShort(fromSi('temperature', kelvin, units.temperature))}\u00a0${unitLabel('temperature', units.temperature)}`;
  return [
    { id: 'method', head: words.estimate, name: words.estimate, value: (row) => row.method },
    ...estimates.temperatures.flatMap((kelvin, i): DataColumn<Method>[] => [
      {
        id: `D ${i}`,
        head: (
          <>
            <i>D</i>({at(kelvin)})
          </>
        ),
        unit: <Unit>{unit}</Unit>,
        name: `D(${at(kelvin)}) / (${unit})`,
        numeric: true,
        wideOnly: i > 0,
        value: (row) => fromSi('diffusivity', row.diffusivities[i]!, units.diffusivity) * scale,
        cell: (row) => fourDigits(fromSi('diffusivity', row.diffusivities[i]!, units.diffusivity) * scale),
      },
      {
        id: `against ${i}`,
        head: words.against,
        unit: '%',
        name: `${words.against}, ${at(kelvin)} / %`,
        numeric: true,
        wideOnly: i > 0,
        value: (row) => row.deviations[i]!,
        cell: (row) => formatSigned(row.deviations[i]!, 1),
      },
    ]),
    {
      id: 'usual',
      head: words.usual,
      unit: '%',
      name: `${words.usual} / %`,
      numeric: true,
      value: (row) => row.usualMeanError ?? null,
      cell: (row) => (row.usualMeanError == null ? '' : formatShort(row.usualMeanError)),
    },
  ];
}

/** Four significant digits: an estimate claims no more. */
const fourDigits = (value: number): string =>
  formatNumber(value, Math.max(0, 3 - Math.floor(Math.log10(Math.abs(value)))));
