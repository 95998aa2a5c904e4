import { chakra } from '@chakra-ui/react';
import { useMemo, useState } from 'react';
import { fill } from '../../lib/fill';
import { useReaderUnits } from '../../lib/units';
import { fitStrings } from '../../strings/fits';
import { Figure } from '../../ui/figure/figure';
import { SeriesKey } from '../../ui/marks/series-key';
import { Typeset } from '../../ui/numbers/typeset';
import { MarginBlock } from '../../ui/page/margin-block';
import { Section } from '../../ui/page/section';
import { type PairSeries } from './pair-series';
import { PointReading } from './point-reading';
import { residualFigure, type Against } from './residual-figures';
import { workspaceTable } from './workspace-figure';

const words = fitStrings.fitPage;

interface ResidualsSectionProps {
  readonly series: readonly PairSeries[];
  readonly validity: { readonly low: number; readonly high: number };
}

/** Residuals against T, against P and by series; a point chosen in one is marked in all. */
export function ResidualsSection({ series, validity }: ResidualsSectionProps) {
  const [selected, setSelected] = useState<string | null>(null);
  const shared = { series, validity, selected, onSelect: setSelected };
  const used = series.filter(({ carriesWeight }) => carriesWeight);
  return (
    <Section
      number={3}
      title={words.residuals}
      id="residuals"
      margin={
        <MarginBlock title={words.seriesKeys}>
          <chakra.ul listStyle="none">
            {used.map((one) => (
              <li key={one.id}>
                <SeriesKey index={one.mark} />
                {one.letter}, {one.title}
              </li>
            ))}
          </chakra.ul>
        </MarginBlock>
      }
    >
      <Residuals {...shared} number={1} against="temperature" />
      <chakra.div
        display="grid"
        gridTemplateColumns={{ base: 'minmax(0, 1fr)', lg: 'repeat(2, minmax(0, 1fr))' }}
        gap="0 36px"
      >
        <Residuals {...shared} number={2} against="pressure" />
        <Residuals {...shared} number={3} against="series" />
      </chakra.div>
    </Section>
  );
}

interface ResidualsProps extends ResidualsSectionProps {
  readonly number: number;
  readonly against: Against;
  readonly selected: string | null;
  readonly onSelect: (id: string | null) => void;
}

function Residuals({ number, against, series, validity, selected, onSelect }: ResidualsProps) {
  const units = useReaderUnits();
  const spec = useMemo(() => residualFigure(against, series, validity, units), [against, series, validity, units]);
  const data = useMemo(() => workspaceTable({ series }, units), [series, units]);
  return (
    <Figure
      number={number}
      caption={<Typeset>{words.residualsCaptions[against]}</Typeset>}
      description={fill(words.residualsDescription, {
        points: data.rows.length,
        against: words.residualsAgainst[against],
      })}
      spec={spec}
      data={data}
      file={`residuals-${against}`}
      selected={selected}
      onSelect={onSelect}
      reading={(id) => <Reading series={series} id={id} />}
    />
  );
}

function Reading({ series, id }: { readonly series: readonly PairSeries[]; readonly id: string }) {
  for (const one of series) {
    const point = one.points.find((candidate) => candidate.id === id);
    if (point !== undefined) return <PointReading series={one} point={point} reason={null} />;
  }
  return null;
}
