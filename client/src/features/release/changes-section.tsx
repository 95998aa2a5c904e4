import { skipToken, useQuery } from '@apollo/client/react';
import { useMemo } from 'react';
import { ReleaseChangesDocument, type VersionAtReleaseFragment } from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { fill } from '../../lib/fill';
import { formatNumber, formatShort, formatSigned, withUnit } from '../../lib/format-quantity';
import { differenceFromSi, fromSi, type ReaderUnits, unitLabel, useReaderUnits } from '../../lib/units';
import { versionStrings } from '../../strings/versions';
import { Empty, Failed, Loading } from '../../ui/feedback/states';
import { NoteMark } from '../../ui/marks/marks';
import { Concise, Unit } from '../../ui/numbers/num';
import { Typeset } from '../../ui/numbers/typeset';
import { MarginBlock } from '../../ui/page/margin-block';
import { Section } from '../../ui/page/section';
import { DataTable, type DataColumn } from '../../ui/table/data-table';
import { changeRows, isNewEdition, largestChange, type ChangeRow } from './changes';

const words = versionStrings.release;

/** D of the version in force and of this one, at both ends of the range and at T0. */
export function ChangesSection({ version }: { readonly version: VersionAtReleaseFragment }) {
  const units = useReaderUnits();
  const { current } = version.sheet;
  const { validity, referenceTemperature, referencePressure } = version.correlation;
  const temperatures = useMemo(
    () =>
      [...new Set([validity.temperatureMinimum, referenceTemperature, validity.temperatureMaximum])].sort(
        (a, b) => a - b,
      ),
    [validity, referenceTemperature],
  );
  const { data, error } = useQuery(
    ReleaseChangesDocument,
    current
      ? { variables: { id: version.id, currentId: current.id, temperatures, pressures: [referencePressure] } }
      : skipToken,
  );
  const [next, before] = [data?.next, data?.current];
  const both =
    next?.__typename === 'DataSheetVersion' && before?.__typename === 'DataSheetVersion' ? { next, before } : null;
  const rows =
    both === null ? [] : changeRows(temperatures, both.before.correlation.evaluate, both.next.correlation.evaluate);
  const largest = largestChange(rows);
  const kelvin = (T: number) =>
    withUnit(formatShort(fromSi('temperature', T, units.temperature), 5), unitLabel('temperature', units.temperature));
  return (
    <Section
      number={2}
      title={words.changes}
      id="changes"
      margin={
        current &&
        largest && (
          <MarginBlock>
            <p>
              <NoteMark />
              {fill(words.largest, {
                percent: formatNumber(100 * Math.abs(largest.change), 1),
                temperature: kelvin(largest.temperature),
                kind: isNewEdition(version.number, current.number) ? words.kindEdition : words.kindRevision,
              })}
            </p>
          </MarginBlock>
        )
      }
    >
      {!current && <Empty sentence={words.changesNone} />}
      {error && <Failed what={versionStrings.failed} why={errorMessage(error)} />}
      {current && !both && !error && <Loading what={versionStrings.what} />}
      {current && both && (
        <DataTable
          label={words.changes}
          columns={columnsOf(version.number, current.number, units, kelvin)}
          rows={rows}
          rowId={({ temperature }) => String(temperature)}
          file={`${version.sheet.code}-${version.number}-changes`}
          filterable={false}
          tools={
            <span>
              <Typeset>
                {fill(words.at, {
                  pressure: withUnit(
                    formatShort(fromSi('pressure', referencePressure, units.pressure)),
                    unitLabel('pressure', units.pressure),
                  ),
                })}
              </Typeset>{' '}
              {words.seriesWeight}: {both.before.fit.series.length}, {both.next.fit.series.length}.
            </span>
          }
        />
      )}
    </Section>
  );
}

function columnsOf(
  next: string,
  current: string,
  units: ReaderUnits,
  kelvin: (T: number) => string,
): DataColumn<ChangeRow>[] {
  const unit = unitLabel('diffusivity', units.diffusivity);
  const value = (side: 'current' | 'next', name: string): DataColumn<ChangeRow> => ({
    id: side,
    head: name,
    name,
    numeric: true,
    sortable: false,
    value: (row) => fromSi('diffusivity', row[side].value, units.diffusivity),
    cell: (row) => (
      <Concise
        value={fromSi('diffusivity', row[side].value, units.diffusivity)}
        uncertainty={differenceFromSi('diffusivity', row[side].uncertainty, units.diffusivity)}
      />
    ),
  });
  return [
    {
      id: 'quantity',
      head: words.quantity,
      name: words.quantity,
      sortable: false,
      value: ({ temperature }) => `D(${kelvin(temperature)}) / (${unit})`,
      cell: ({ temperature }) => (
        <>
          <i>D</i>({kelvin(temperature)}) / (<Unit>{unit}</Unit>)
        </>
      ),
    },
    value('current', current),
    value('next', next),
    {
      id: 'change',
      head: words.change,
      unit: <Typeset>{words.changeUnit}</Typeset>,
      name: `${words.change} / %`,
      numeric: true,
      sortable: false,
      value: ({ change }) => Number((100 * change).toFixed(3)),
      cell: ({ change, inOlderU }) => (
        <>
          {formatSigned(100 * change, 1)}&nbsp;%, {formatNumber(inOlderU, 2)}&nbsp;<i>U</i>
        </>
      ),
    },
  ];
}
