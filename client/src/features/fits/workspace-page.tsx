import { useQuery } from '@apollo/client/react';
import { useMemo } from 'react';
import { PairEstimatesDocument, WorkspaceDocument } from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { counted } from '../../lib/counted';
import { fill } from '../../lib/fill';
import { pairTitle } from '../../lib/pair-title';
import { parseNumber } from '../../lib/parse-number';
import { paths } from '../../lib/paths';
import { fitStrings } from '../../strings/fits';
import { Empty, Failed, Loading } from '../../ui/feedback/states';
import { StateMark, stateOf } from '../../ui/marks/state-mark';
import { MarginBlock } from '../../ui/page/margin-block';
import { Page } from '../../ui/page/page';
import { Opening } from '../../ui/page/section';
import { choiceOfFit, firstChoice, fitInput, isSameChoice, type Choice } from './choice';
import { CompareSection } from './compare-section';
import { logRange, temperaturesAlong, type Range } from './figure-ranges';
import { BringInBlock, KeysBlock } from './ledger-margin';
import { LedgerSection } from './ledger-section';
import { pairSeries, type PairSeries } from './pair-series';
import { PictureSection } from './picture-section';
import { RecipeMargin } from './recipe-margin';
import { useChoice } from './use-choice';
import { usePreview, type Preview } from './use-preview';
import { WaitingSeries } from './waiting-series';
import { type Curve, type EstimateLine } from './workspace-figure';
import { type Pair } from './workspace-pair';

const pairs = { name: fitStrings.path.pairs, to: paths.pairs() };

/** The workspace of a pair: see, leave out, fit, keep. */
export function WorkspacePage({ id }: { readonly id: string }) {
  const { data, error, refetch } = useQuery(WorkspaceDocument, { variables: { id }, fetchPolicy: 'cache-and-network' });
  if (data?.pairById) return <Workspace pair={data.pairById} />;
  const title = fitStrings.path.workspace;
  return (
    <Page title={title} path={[pairs, { name: title }]}>
      <Opening small title={title}>
        {error && (
          <Failed what={fitStrings.failed.workspace} why={errorMessage(error)} onRetry={() => void refetch()} />
        )}
        {!error && !data && <Loading what={fitStrings.what.workspace} />}
        {data && <Empty sentence={fitStrings.missing.pair} />}
      </Opening>
    </Page>
  );
}

function Workspace({ pair }: { readonly pair: Pair }) {
  const title = pairTitle(pair.substances);
  const all = useMemo(() => pair.series.edges.map(({ node }) => node), [pair]);
  const newest = pair.fits[0] ?? null;
  const start = useMemo(() => (newest === null ? firstChoice(all) : choiceOfFit(newest)), [newest, all]);
  const { choice, dispatch, forget } = useChoice(pair.id, start);
  const input = useMemo(() => fitInput(choice, pair.id, all), [choice, pair.id, all]);
  const axis = useTemperatureAxis(all);
  const temperatures = useMemo(() => axisTemperatures(axis, all, choice), [axis, all, choice]);
  const preview = usePreview(input, temperatures);
  const referencePressure = 1000 * (parseNumber(choice.recipe.referencePressure) || 101.325);
  const curve = useMemo(() => curveOf(preview), [preview]);
  const series = useMemo(
    () => pairSeries({ series: all, choice, referencePressure, analysis: preview.analysis, curve }),
    [all, choice, referencePressure, preview.analysis, curve],
  );
  const estimates = useEstimates(pair.id, axis, referencePressure);
  const kept = newest !== null && isSameChoice(choice, choiceOfFit(newest)) ? newest : null;
  const picture = { series, curve, estimates: estimates.lines, temperatures: axis, referencePressure };
  const number = kept?.number ?? (newest?.number ?? 0) + 1;
  return (
    <Page
      title={`${title}, ${fitStrings.path.workspace}`}
      path={[pairs, { name: title }, { name: fitStrings.path.workspace }]}
      folio={
        <StateMark state={kept === null ? 'draft' : 'accepted'}>
          {fill(kept === null ? fitStrings.folio.notKept : fitStrings.folio.kept, { number })}
        </StateMark>
      }
    >
      <Opening small title={title} lead={leadOf(series)} margin={<SheetBlock pair={pair} />} />
      <PictureSection
        title={title}
        picture={picture}
        estimateNames={estimates.names}
        pointsOut={choice.pointsOut}
        dispatch={dispatch}
        margin={
          <RecipeMargin
            pair={pair}
            choice={choice}
            input={input}
            preview={preview}
            kept={kept}
            series={series}
            dispatch={dispatch}
            forget={forget}
          />
        }
      />
      <LedgerSection
        series={series}
        tint={tintOf(curve)}
        dispatch={dispatch}
        margin={
          <>
            <KeysBlock />
            <BringInBlock pairId={pair.id} />
          </>
        }
      >
        <WaitingSeries series={series} />
      </LedgerSection>
      <CompareSection number={3} fits={pair.fits} pairId={pair.id} />
    </Page>
  );
}

function SheetBlock({ pair: { dataSheet } }: { readonly pair: Pair }) {
  const words = fitStrings.margin;
  const open =
    dataSheet?.versions.filter(({ status }) => ['DRAFT', 'IN_REVIEW', 'RETURNED', 'APPROVED'].includes(status)) ?? [];
  return (
    <MarginBlock
      entries={[
        [
          words.sheet,
          dataSheet?.current ? (
            <VersionLink key="current" code={dataSheet.code} number={dataSheet.current.number} status="RELEASED" />
          ) : (
            words.noSheet
          ),
        ],
        ...open.map(
          (version) =>
            [
              words.open,
              <VersionLink key={version.id} code={dataSheet!.code} number={version.number} status={version.status} />,
            ] as const,
        ),
      ]}
    />
  );
}

type VersionStatus = NonNullable<Pair['dataSheet']>['versions'][number]['status'];

const VersionLink = ({
  code,
  number,
  status,
}: {
  readonly code: string;
  readonly number: string;
  readonly status: VersionStatus;
}) => (
  <StateMark state={stateOf(status)}>
    <a href={paths.version(code, number)}>{fill(fitStrings.margin.version, { number, state: stateOf(status) })}</a>
  </StateMark>
);

/** Eight series, 47 points. Two are left out. */
function leadOf(all: readonly PairSeries[]): string {
  const words = fitStrings.lead;
  const series = all.filter(({ status }) => status === 'ACCEPTED');
  if (series.length === 0) return words.none;
  const points = series.reduce((sum, one) => sum + one.points.length, 0);
  const first = `${counted(words.series, series.length)}, ${counted(words.points, points)}.`;
  const out = series.filter(({ carriesWeight }) => !carriesWeight).length;
  const single = series
    .filter(({ carriesWeight }) => carriesWeight)
    .reduce((sum, one) => sum + one.points.filter(({ open }) => open).length, 0);
  const rest = out + single === 0 ? [words.carry] : [counted(words.out, out), counted(words.pointsOut, single)];
  const text = [first, ...rest].filter(Boolean).join(' ');
  return text.charAt(0).toUpperCase() + text.slice(1);
}

/** The T axis holds every point that is shown. */
function useTemperatureAxis(all: Parameters<typeof fitInput>[2]): Range {
  return useMemo(() => {
    const shown = all.filter(({ status }) => status === 'ACCEPTED' || status === 'SUBMITTED');
    const range = logRange(
      shown.flatMap(({ points }) => points.map(({ temperature }) => temperature)),
      0.05,
    );
    return shown.length === 0 ? { min: 250, max: 450 } : range;
  }, [all]);
}

const CURVE_POINTS = 81;

/** Temperatures to draw the curve at: along the axis, and exactly where the range will begin and end. */
function axisTemperatures(axis: Range, all: Parameters<typeof fitInput>[2], choice: Choice): number[] {
  const used = all
    .filter(({ id, status }) => status === 'ACCEPTED' && choice.seriesOut[id] === undefined)
    .flatMap(({ points }) =>
      points.filter(({ id }) => choice.pointsOut[id] === undefined).map(({ temperature }) => temperature),
    );
  const ends = used.length === 0 ? [] : [Math.min(...used), Math.max(...used)];
  return [...new Set([...temperaturesAlong(axis, CURVE_POINTS), ...ends])].sort((a, b) => a - b);
}

function curveOf({ analysis, temperatures }: Preview): Curve | null {
  if (analysis === null || temperatures.length !== analysis.correlation.curve.diffusivities.length) return null;
  const { curve, newLaboratory, validity } = analysis.correlation;
  return {
    temperatures,
    diffusivities: curve.diffusivities,
    expandedUncertainties: curve.expandedUncertainties,
    newLaboratory: newLaboratory?.expandedUncertainties ?? null,
    low: validity.temperatureMinimum,
    high: validity.temperatureMaximum,
  };
}

/** The interval for one new laboratory in the middle of the curve, relative. */
function tintOf(curve: Curve | null): number | null {
  const middle = Math.floor((curve?.temperatures.length ?? 0) / 2);
  const half = curve?.newLaboratory?.[middle];
  const D = curve?.diffusivities[middle];
  return half === undefined || D === undefined ? null : half / D;
}

/** Estimates of kinetic theory, behind the points. */
function useEstimates(
  id: string,
  axis: Range,
  pressure: number,
): { readonly lines: EstimateLine[]; readonly names: string[] } {
  const temperatures = useMemo(() => temperaturesAlong(axis, CURVE_POINTS), [axis]);
  const { data } = useQuery(PairEstimatesDocument, { variables: { id, temperatures, pressure } });
  const found = data?.pairById?.estimates;
  return useMemo(
    () => ({
      lines: (found ?? []).map(({ diffusivities }) => ({ temperatures, diffusivities })),
      names: (found ?? []).map(({ label }) => label),
    }),
    [found, temperatures],
  );
}
