import { chakra } from '@chakra-ui/react';
import { type ReactNode } from 'react';
import { type AnalysisNumbersFragment, type CorrelationNumbersFragment } from '../../gql/graphql';
import { fill } from '../../lib/fill';
import { formatNumber } from '../../lib/format-quantity';
import { fitStrings } from '../../strings/fits';
import { Num } from '../../ui/numbers/num';
import { Typeset } from '../../ui/numbers/typeset';
import { MarginBlock, type MarginEntry } from '../../ui/page/margin-block';
import { ParameterSymbol, ParameterValue } from './parameter';
import { deviationText } from './small-number';
import { probability } from './statements';

const words = fitStrings.result;

interface ResultBlockProps {
  readonly analysis: AnalysisNumbersFragment & { readonly correlation: CorrelationNumbersFragment };
  readonly pointCount: number;
  /** The figures are of an earlier choice. */
  readonly stale: boolean;
}

/** The numbers of the fit as it is being chosen. */
export function ResultBlock({ analysis, pointCount, stale }: ResultBlockProps) {
  const { correlation, statistics, betweenSeriesSlopeDeviation } = analysis;
  const { betweenSeriesDeviation: tau, reducedChiSquare, residualDegreesOfFreedom, aicc } = statistics;
  const entries: MarginEntry[] = [
    ...correlation.parameters.map((parameter): MarginEntry => [
      <ParameterSymbol key={parameter.symbol} symbol={parameter.symbol} />,
      <ParameterValue key={parameter.symbol} parameter={parameter} />,
    ]),
    ...coefficients(analysis),
    [
      <Typeset key="tau">{words.tau}</Typeset>,
      tau == null
        ? null
        : `${deviationText(100 * tau)}\u00a0%${statistics.betweenSeriesOrigin === 'ASSIGNED' ? `, ${words.assigned}` : ''}`,
    ],
    [<TauSlope key="slope" />, betweenSeriesSlopeDeviation == null ? null : deviationText(betweenSeriesSlopeDeviation)],
    [
      <Typeset key="chi">{words.chiSquare}</Typeset>,
      reducedChiSquare == null ? null : (
        <ChiSquare
          key="chi"
          reduced={reducedChiSquare}
          nu={residualDegreesOfFreedom}
          p={statistics.chiSquareProbability ?? null}
        />
      ),
    ],
    ['AICc', aicc == null ? null : formatNumber(aicc, 1)],
    [words.points, fill(words.pointsValue, { used: statistics.pointCount, all: pointCount })],
  ];
  return (
    <Fading stale={stale}>
      <MarginBlock title={words.title} entries={entries} />
    </Fading>
  );
}

export const Fading = ({ stale, children }: { readonly stale: boolean; readonly children: ReactNode }) => (
  <chakra.div
    aria-busy={stale || undefined}
    opacity={stale ? 0.6 : 1}
    role="status"
    _motionSafe={{ transition: 'opacity 120ms' }}
  >
    {children}
  </chakra.div>
);

/** τ with a low n. */
export const TauSlope = () => (
  <>
    <i>τ</i>
    <sub>
      <i>n</i>
    </sub>
  </>
);

const ChiSquare = ({
  reduced,
  nu,
  p,
}: {
  readonly reduced: number;
  readonly nu: number;
  readonly p: number | null;
}) => (
  <Num>
    {formatNumber(reduced, 2)}, <i>ν</i> = {nu}
    {p !== null && (
      <>
        , <i>p</i> {probability(p)}
      </>
    )}
  </Num>
);

/** Correlation coefficients of the fitted parameters, each pair once. */
function coefficients({ correlation, correlationMatrix }: ResultBlockProps['analysis']): MarginEntry[] {
  const free = correlation.parameters.filter(({ standardUncertainty }) => standardUncertainty != null);
  return free.flatMap(({ symbol: a }, i) =>
    free.slice(i + 1).map(({ symbol: b }, j): MarginEntry => {
      const r = correlationMatrix[i]?.[i + 1 + j];
      const label = (
        <span key={`${a} ${b}`}>
          <i>r</i>(<ParameterSymbol symbol={a} />, <ParameterSymbol symbol={b} />)
        </span>
      );
      return [label, r === undefined ? null : formatNumber(r, 3)];
    }),
  );
}
