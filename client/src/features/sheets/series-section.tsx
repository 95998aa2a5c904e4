import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { type SheetNumbersFragment, type SheetSeriesRowFragment, type SheetTextFragment } from '../../gql/graphql';
import { fill } from '../../lib/fill';
import { formatNumber, formatShort, formatSigned } from '../../lib/format-quantity';
import { fromSi, type ReaderUnits, unitLabel, useReaderUnits } from '../../lib/units';
import { sheetStrings } from '../../strings/sheets';
import { SeriesKey } from '../../ui/marks/series-key';
import { Quantity } from '../../ui/numbers/quantity';
import { Typeset } from '../../ui/numbers/typeset';
import { MarginBlock } from '../../ui/page/margin-block';
import { Section } from '../../ui/page/section';
import { ledgerRecipe } from '../../ui/recipes/table.recipe';
import { DataTable, type DataColumn } from '../../ui/table/data-table';
import { Paragraphs } from './paragraphs';

const words = sheetStrings.series;

interface SeriesSectionProps {
  readonly number: number;
  readonly title: string;
  readonly content: SheetTextFragment & SheetNumbersFragment;
  readonly file: string;
}

/** Series that carried weight, then those left out with the reason, then single points left out. */
export function SeriesSection({ number, title, content, file }: SeriesSectionProps) {
  const units = useReaderUnits();
  const rows = [...content.seriesUsed, ...content.seriesLeftOut];
  return (
    <Section
      number={number}
      title={title}
      id="series"
      margin={
        <>
          <MarginBlock title={sheetStrings.margin.trace}>
            <p>{sheetStrings.margin.traceNote}</p>
          </MarginBlock>
          {content.margin.series.length > 0 && (
            <MarginBlock>
              <Paragraphs paragraphs={content.margin.series} />
            </MarginBlock>
          )}
        </>
      }
    >
      <DataTable
        label={title}
        columns={seriesColumns(units)}
        rows={rows}
        rowId={(row) => row.key}
        file={`${file}-series`}
        filterable={false}
        secondLine={(row) => row.reason !== null && <Reason series={row} />}
      />
      <PointsLeftOut content={content} file={file} />
    </Section>
  );
}

function Reason({ series }: { readonly series: SheetSeriesRowFragment }) {
  const styles = useSlotRecipe({ recipe: ledgerRecipe })();
  return (
    <chakra.span css={styles.reason}>
      <b>{words.leftOut}</b>
      {series.reason}
    </chakra.span>
  );
}

const percent = (relative: number | null | undefined, places: number) =>
  relative == null ? '' : formatNumber(100 * relative, places);

function seriesColumns(units: ReaderUnits): DataColumn<SheetSeriesRowFragment>[] {
  const temperature = unitLabel('temperature', units.temperature);
  const at = (kelvin: number) => formatShort(fromSi('temperature', kelvin, units.temperature), 4);
  return [
    {
      id: 'key',
      head: words.seriesName,
      name: words.seriesName,
      value: (row) => row.key,
      cell: (row) => (
        <span style={{ whiteSpace: 'nowrap' }}>
          <SeriesKey index={row.mark} open={row.reason !== null} />
          {row.key}
        </span>
      ),
    },
    {
      id: 'source',
      head: words.source,
      name: words.source,
      value: (row) => row.title,
      cell: (row) => (
        <Source
          series={row}
          temperatures={`${at(row.temperatureMinimum)} to ${at(row.temperatureMaximum)} ${temperature}`}
        />
      ),
    },
    { id: 'method', head: words.method, name: words.method, value: (row) => row.method, wideOnly: true },
    {
      id: 'n',
      head: <i>n</i>,
      name: 'n',
      numeric: true,
      wideOnly: true,
      value: (row) => row.pointCount,
      cell: (row) => pointsOf(row),
    },
    {
      id: 'temperature',
      head: <i>T</i>,
      unit: temperature,
      name: `T / ${temperature}`,
      numeric: true,
      wideOnly: true,
      value: (row) => row.temperatureMinimum,
      cell: (row) => `${at(row.temperatureMinimum)} to ${at(row.temperatureMaximum)}`,
    },
    {
      id: 'stated',
      head: <Typeset>{words.stated}</Typeset>,
      unit: '%',
      name: 'u(D)/D / %',
      numeric: true,
      wideOnly: true,
      value: (row) => (row.relativeUncertainty == null ? null : 100 * row.relativeUncertainty),
      cell: (row) => (
        <>
          {percent(row.relativeUncertainty, 1)}
          {row.uncertaintyAssigned && <sup title={words.assigned}>{words.assigned}</sup>}
        </>
      ),
    },
    {
      id: 'offset',
      head: <Typeset>{words.offset}</Typeset>,
      unit: '%',
      name: 'offset / %',
      numeric: true,
      value: (row) => (row.offset == null ? null : 100 * row.offset),
      cell: (row) =>
        row.offset == null ? '' : `${formatSigned(100 * row.offset, 1)} ± ${percent(row.offsetStandardUncertainty, 1)}`,
    },
  ];
}

const pointsOf = ({ pointCount, weightedPointCount, reason }: SheetSeriesRowFragment) =>
  reason === null && weightedPointCount < pointCount
    ? fill(words.ofPoints, { weighted: weightedPointCount, all: pointCount })
    : String(pointCount);

/** The source; on a narrow screen method, points and temperatures on a second line. */
const Source = ({
  series,
  temperatures,
}: {
  readonly series: SheetSeriesRowFragment;
  readonly temperatures: string;
}) => (
  <>
    <span title={series.source}>{series.title}</span>
    <chakra.span display={{ base: 'block', md: 'none' }} color="ink2" fontSize="13px" lineHeight="18px">
      {`${series.method}, ${series.pointCount} points, ${temperatures}`}
    </chakra.span>
  </>
);

function PointsLeftOut({ content, file }: { readonly content: SheetNumbersFragment; readonly file: string }) {
  if (content.pointsLeftOut.length === 0) return null;
  const rows = content.pointsLeftOut.map((point, index) => ({ ...point, index }));
  type Row = (typeof rows)[number];
  const columns: DataColumn<Row>[] = [
    { id: 'series', head: words.seriesName, name: words.seriesName, value: (row) => row.seriesKey },
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
      cell: (row) => <Quantity kind="diffusivity" value={row.diffusivity} />,
    },
    {
      id: 'deviation',
      head: words.deviation,
      unit: '%',
      name: `${words.deviation} / %`,
      numeric: true,
      value: (row) => row.deviation,
      cell: (row) => formatSigned(row.deviation, 1),
    },
    { id: 'reason', head: words.reason, name: words.reason, value: (row) => row.reason },
  ];
  return (
    <>
      <chakra.h3 textStyle="subsection" marginTop="24px" marginBottom="8px">
        {words.points}
      </chakra.h3>
      <DataTable
        label={words.points}
        columns={columns}
        rows={rows}
        rowId={(row) => String(row.index)}
        file={`${file}-points-left-out`}
      />
    </>
  );
}
