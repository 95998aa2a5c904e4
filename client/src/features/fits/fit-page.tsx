import { useQuery } from '@apollo/client/react';
import { chakra } from '@chakra-ui/react';
import { useMemo } from 'react';
import { Link } from 'react-router-dom';
import { FitDetailDocument } from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { counted } from '../../lib/counted';
import { fill } from '../../lib/fill';
import { formatDate } from '../../lib/format-quantity';
import { pairTitle } from '../../lib/pair-title';
import { paths } from '../../lib/paths';
import { hasRole, usePerson } from '../../lib/session';
import { useReaderUnits } from '../../lib/units';
import { fitStrings } from '../../strings/fits';
import { Empty, Failed, Loading } from '../../ui/feedback/states';
import { StateMark, stateOf } from '../../ui/marks/state-mark';
import { rangeText } from '../../ui/numbers/quantity';
import { Typeset } from '../../ui/numbers/typeset';
import { MarginBlock } from '../../ui/page/margin-block';
import { Page } from '../../ui/page/page';
import { Opening, Section } from '../../ui/page/section';
import { choiceOfFit } from './choice';
import { type DetailedFit } from './detailed-fit';
import { FitSeriesSection } from './fit-series-section';
import { pairSeries, type PairSeries } from './pair-series';
import { ParametersSection } from './parameters-section';
import { ReproduceBlock } from './reproduce-block';
import { beyondTwo } from './residual-figures';
import { ResidualsSection } from './residuals-section';
import { decisions, type Statement } from './statements';
import { Statements } from './warnings';

const words = fitStrings.fitPage;
const pairs = { name: fitStrings.path.pairs, to: paths.pairs() };

/** One kept fit: what it is, whether it can carry a sheet, and what it was made from. */
export function FitPage({ id }: { readonly id: string }) {
  const { data, error, refetch } = useQuery(FitDetailDocument, { variables: { id } });
  if (data?.fit) return <FitLeaf fit={data.fit} />;
  const title = fitStrings.fitTitle.replace(' {number}', '');
  return (
    <Page title={title} path={[pairs, { name: title }]}>
      <Opening small title={title}>
        {error && <Failed what={fitStrings.failed.fit} why={errorMessage(error)} onRetry={() => void refetch()} />}
        {!error && !data && <Loading what={fitStrings.what.fit} />}
        {data && <Empty sentence={fitStrings.missing.fit} />}
      </Opening>
    </Page>
  );
}

function FitLeaf({ fit }: { readonly fit: DetailedFit }) {
  const { pair, number, analysis } = fit;
  const name = pairTitle(pair.substances);
  const title = fill(fitStrings.fitTitle, { number });
  const all = useMemo(() => pair.series.edges.map(({ node }) => node), [pair]);
  const series = useMemo(
    () =>
      pairSeries({
        series: all,
        choice: choiceOfFit(fit),
        referencePressure: fit.correlation.referencePressure,
        analysis,
        curve: null,
        only: new Set(analysis.series.map(({ seriesId }) => seriesId)),
      }),
    [all, fit, analysis],
  );
  const { temperatureMinimum: low, temperatureMaximum: high } = fit.correlation.validity;
  const statements = [...decisions(analysis.statistics, analysis.warnings), beyondStatement(series)];
  return (
    <Page
      title={`${title}, ${name}`}
      path={[pairs, { name, to: paths.pair(pair.id) }, { name: title }]}
      folio={
        <>
          <chakra.b fontWeight={600}>{`${title}, ${words.kept}`}</chakra.b>
          <span>{formatDate(fit.createdAt)}</span>
        </>
      }
    >
      <Opening
        small
        title={`${title}, ${name.charAt(0).toLowerCase()}${name.slice(1)}`}
        lead={<Lead fit={fit} />}
        margin={<IdentityBlock fit={fit} />}
      />
      <ParametersSection fit={fit} />
      <Section number={2} title={words.decides} id="decides" margin={<ReproduceBlock fit={fit} all={all} />}>
        <Statements statements={statements} />
      </Section>
      <ResidualsSection series={series} validity={{ low, high }} />
      <FitSeriesSection series={series} fit={fit} />
    </Page>
  );
}

function beyondStatement(series: readonly PairSeries[]): Statement {
  const { count, all, expected } = beyondTwo(series);
  const verdict = fill(words.beyond, { n: count, all, expected: Math.round(expected) });
  return { tone: count > 2 * Math.max(1, expected) ? 'warning' : 'note', verdict, reason: '' };
}

function Lead({ fit }: { readonly fit: DetailedFit }) {
  const units = useReaderUnits();
  const { validity, form } = fit.correlation;
  const { recipe, lead } = fitStrings;
  const values = {
    form: recipe.allForms[form],
    objective: recipe.setObjectives[fit.objective],
    points: counted(lead.points, fit.statistics.pointCount),
    series: counted(lead.series, fit.statistics.seriesCount),
    range: rangeText('temperature', validity.temperatureMinimum, validity.temperatureMaximum, units.temperature, 5),
    weighting: recipe.setWeightings[fit.weighting],
    effect: recipe.seriesEffects[fit.seriesEffect],
  };
  return <Typeset>{fill(words.leadForm, values)}</Typeset>;
}

function IdentityBlock({ fit }: { readonly fit: DetailedFit }) {
  const mayDraft = hasRole(usePerson(), 'EDITOR');
  const { dataSheet } = fit.pair;
  const carries = dataSheet?.versions.filter((version) => version.fit.id === fit.id) ?? [];
  return (
    <>
      <MarginBlock
        entries={[
          [words.madeBy, fit.createdBy?.name],
          [words.on, formatDate(fit.createdAt)],
          ...carries.map(
            (version) =>
              [
                words.carries,
                <StateMark key={version.id} state={stateOf(version.status)}>
                  <Link
                    to={paths.version(dataSheet?.code ?? '', version.number)}
                  >{`${version.number}, ${stateOf(version.status)}`}</Link>
                </StateMark>,
              ] as const,
          ),
          [words.engine, fit.engineVersion],
        ]}
      />
      <MarginBlock>
        <p>
          <Link to={paths.pair(fit.pair.id)}>{words.start}</Link>
        </p>
        {mayDraft && (
          <p>
            <Link to={paths.draftVersion(fit.id)}>{words.draft}</Link>
          </p>
        )}
      </MarginBlock>
    </>
  );
}
