import { skipToken, useQuery } from '@apollo/client/react';
import { chakra } from '@chakra-ui/react';
import { useMemo } from 'react';
import { OneSeriesDocument, type SeriesDetailFragment, SeriesSurroundingsDocument } from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { counted } from '../../lib/counted';
import { fill } from '../../lib/fill';
import { formatDate, formatSigned } from '../../lib/format-quantity';
import { pairTitle } from '../../lib/pair-title';
import { paths } from '../../lib/paths';
import { fromSi, unitLabel, useReaderUnits } from '../../lib/units';
import { seriesStrings } from '../../strings/series';
import { Banner } from '../../ui/feedback/banner';
import { Empty, Failed, Loading } from '../../ui/feedback/states';
import { Figure } from '../../ui/figure/figure';
import { FigureKeys } from '../../ui/figure/keys';
import { WarnMark } from '../../ui/marks/marks';
import { StateMark, stateOf } from '../../ui/marks/state-mark';
import { Quantity, rangeText } from '../../ui/numbers/quantity';
import { Typeset } from '../../ui/numbers/typeset';
import { Page } from '../../ui/page/page';
import { Opening, Section } from '../../ui/page/section';
import { PointsTable } from './points-table';
import { SeriesActions } from './series-actions';
import {
  curveTemperatures,
  deviationFrom,
  LINES,
  REFERENCE_PRESSURE,
  reducedOf,
  referenceWords,
  seriesFigure,
} from './series-figure';
import { HistoryBlock, ProvenanceBlock, StateBlock } from './series-margin';

const words = seriesStrings;
const list = { name: words.path.series, to: paths.seriesList() };

/** One series: its points, its picture, where it came from, and what can be done with it. */
export function SeriesPage({ id }: { readonly id: string }) {
  const { data, error, refetch } = useQuery(OneSeriesDocument, { variables: { id }, fetchPolicy: 'cache-and-network' });
  if (data?.oneSeries) return <SeriesLeaf series={data.oneSeries} />;
  const title = words.path.series;
  return (
    <Page title={title} path={[list, { name: title }]}>
      <Opening small title={title}>
        {error && <Failed what={words.failed.one} why={errorMessage(error)} onRetry={() => void refetch()} />}
        {!error && !data && <Loading what={words.what.one} />}
        {data && <Empty sentence={words.missing} />}
      </Opening>
    </Page>
  );
}

function SeriesLeaf({ series }: { readonly series: SeriesDetailFragment }) {
  const units = useReaderUnits();
  const pair = pairTitle(series.pair.substances);
  const temperatures = series.points.map(({ temperature }) => temperature);
  const lead = fill(words.lead, {
    points: counted(words.points, series.points.length),
    pair: `${pair.charAt(0).toLowerCase()}${pair.slice(1)}`,
    range: rangeText('temperature', Math.min(...temperatures), Math.max(...temperatures), units.temperature, 5),
    method: series.method,
  });
  return (
    <Page
      title={series.title}
      path={[list, { name: pair, to: paths.pair(series.pair.id) }, { name: series.title }]}
      folio={
        <>
          <StateMark state={stateOf(series.status)} />
          <span>{formatDate(series.events.at(-1)?.at ?? series.createdAt)}</span>
        </>
      }
    >
      <Opening
        small
        title={series.title}
        lead={lead}
        margin={
          <>
            <StateBlock series={series} />
            <ProvenanceBlock series={series} />
          </>
        }
      >
        <WhyItCameBack series={series} />
        <SeriesActions series={series} />
      </Opening>
      <PictureSection series={series} title={series.title} />
      <Section number={2} title={words.table.title} id="points" margin={<HistoryBlock series={series} />}>
        <PointsTable series={series} />
        <chakra.p textStyle="caption" color="ink2">
          {words.table.note}
        </chakra.p>
      </Section>
      <DoubtsSection series={series} />
    </Page>
  );
}

/** The remark with which it was returned or retired, before everything else. */
function WhyItCameBack({ series: { status, events } }: { readonly series: SeriesDetailFragment }) {
  const last = events.at(-1);
  if (last === undefined || (status !== 'RETURNED' && status !== 'RETIRED')) return null;
  const returned = status === 'RETURNED';
  return (
    <Banner
      tone={returned ? 'warning' : 'ruled'}
      mark={<StateMark state={stateOf(status)}>{returned ? words.returnedBanner : words.retiredBanner}</StateMark>}
    >
      {fill(words.saidBy, { person: last.person.name, date: formatDate(last.at) })} {last.remark}{' '}
      {!returned && words.retiredWords}
    </Banner>
  );
}

function PictureSection({ series, title }: { readonly series: SeriesDetailFragment; readonly title: string }) {
  const units = useReaderUnits();
  const temperatures = useMemo(() => curveTemperatures(series.points), [series.points]);
  const variables = { pairId: series.pair.id, temperatures, pressure: REFERENCE_PRESSURE };
  const { data } = useQuery(SeriesSurroundingsDocument, series.points.length === 0 ? skipToken : { variables });
  const estimates = useMemo(() => data?.pairById?.estimates ?? [], [data]);
  const spec = useMemo(
    () => seriesFigure(series.points, series.ordinal, temperatures, estimates, units),
    [series.points, series.ordinal, temperatures, estimates, units],
  );
  const temperature = unitLabel('temperature', units.temperature);
  const diffusivity = unitLabel('diffusivity', units.diffusivity);
  const table = {
    head: ['point', `T / ${temperature}`, `D P/P0 / (${diffusivity})`],
    rows: series.points.map((point, i) => [
      i + 1,
      fromSi('temperature', point.temperature, units.temperature),
      Number(fromSi('diffusivity', reducedOf(point), units.diffusivity).toPrecision(6)),
    ]),
  };
  return (
    <Section number={1} title={words.picture.title} id="picture" tight>
      <Figure
        number={1}
        caption={<Typeset>{fill(words.picture.caption, { pressure: referenceWords(units) })}</Typeset>}
        description={fill(words.picture.description, {
          title,
          pressure: referenceWords(units),
          points: series.points.length,
        })}
        spec={spec}
        data={table}
        file={`series-${title}`}
        reading={(id) => {
          const index = series.points.findIndex((point) => point.id === id);
          const point = series.points[index];
          return (
            point && (
              <>
                <chakra.b fontWeight={600}>{fill(words.picture.point, { number: index + 1 })}</chakra.b>
                <span>
                  <i>T</i> = <Quantity kind="temperature" value={point.temperature} />
                </span>
                <span>
                  <i>P</i> = <Quantity kind="pressure" value={point.pressure} />
                </span>
                <span>
                  <i>D</i> ={' '}
                  <Quantity
                    kind="diffusivity"
                    value={point.diffusivity}
                    uncertainty={point.diffusivityUncertainty ?? null}
                  />
                </span>
                {estimates.slice(0, 1).map((estimate) => {
                  const deviation = deviationFrom(point, temperatures, estimate);
                  return deviation === null ? null : (
                    <span key={estimate.label}>
                      {fill(words.picture.estimate, {
                        percent: formatSigned(100 * deviation, 1),
                        label: estimate.label,
                      })}
                    </span>
                  );
                })}
              </>
            )
          );
        }}
        keys={<FigureKeys lines={estimates.map(({ label }, i) => ({ kind: LINES[i % LINES.length]!, name: label }))} />}
      />
    </Section>
  );
}

function DoubtsSection({ series: { warnings } }: { readonly series: SeriesDetailFragment }) {
  return (
    <Section number={3} title={words.doubts} id="doubts">
      {warnings.length === 0 ? (
        <p>{words.noDoubts}</p>
      ) : (
        <chakra.ul listStyle="none" maxWidth="760px" textStyle="small">
          {warnings.map(({ message, path }) => (
            <chakra.li key={`${path} ${message}`} paddingLeft="20px" textIndent="-20px" marginTop="6px">
              <WarnMark />
              {message}
            </chakra.li>
          ))}
        </chakra.ul>
      )}
    </Section>
  );
}
