import { useMemo, useState } from 'react';
import { type FiguresDataFragment, type SheetNumbersFragment, type SheetTextFragment } from '../../gql/graphql';
import { fill } from '../../lib/fill';
import { formatSigned } from '../../lib/format-quantity';
import { useReaderUnits } from '../../lib/units';
import { sheetStrings } from '../../strings/sheets';
import { Figure } from '../../ui/figure/figure';
import { FigureKeys } from '../../ui/figure/keys';
import { SeriesKey } from '../../ui/marks/series-key';
import { Quantity } from '../../ui/numbers/quantity';
import { Runs, Typeset } from '../../ui/numbers/typeset';
import { MarginBlock } from '../../ui/page/margin-block';
import { Section } from '../../ui/page/section';
import { deviationFigure, diffusivityFigure, estimateStyle, figureTable, pointId, pressureWords } from './figure-specs';
import { Paragraphs } from './paragraphs';

const words = sheetStrings.figures;

interface FiguresSectionProps {
  readonly number: number;
  readonly title: string;
  readonly content: SheetTextFragment & SheetNumbersFragment;
  readonly file: string;
}

/** Measurements and fit: figures 1 and 2 on one temperature axis; a point chosen in one is marked in both. */
export function FiguresSection({ number, title, content, file }: FiguresSectionProps) {
  const units = useReaderUnits();
  const { figures } = content;
  const [selected, setSelected] = useState<string | null>(null);
  const first = useMemo(() => diffusivityFigure(figures, units, words.fit), [figures, units]);
  const second = useMemo(() => deviationFigure(figures, units), [figures, units]);
  const data = useMemo(() => figureTable(figures, units), [figures, units]);
  const counts = {
    title: content.title,
    pressure: pressureWords(figures.pressure, units),
    points: data.rows.length,
    series: figures.series.length,
  };
  const shared = {
    data,
    selected,
    onSelect: setSelected,
    reading: (id: string) => <Reading figures={figures} id={id} />,
  };
  return (
    <Section
      number={number}
      title={title}
      id="figures"
      margin={
        <>
          <MarginBlock title={sheetStrings.margin.axis}>
            <p>{sheetStrings.margin.axisNote}</p>
          </MarginBlock>
          <MarginBlock>
            <p>
              <Runs runs={content.range.sentence} />
            </p>
            <Paragraphs paragraphs={content.margin.figures} />
          </MarginBlock>
        </>
      }
    >
      <Figure
        {...shared}
        number={1}
        caption={<Runs runs={figures.diffusivityCaption} />}
        description={fill(words.diffusivityDescription, counts)}
        spec={first}
        file={`${file}-figure-1`}
      />
      <Figure
        {...shared}
        number={2}
        caption={<Runs runs={figures.deviationCaption} />}
        description={fill(words.deviationDescription, counts)}
        spec={second}
        file={`${file}-figure-2`}
        keys={<Keys figures={figures} />}
      />
    </Section>
  );
}

function Keys({ figures }: { readonly figures: FiguresDataFragment }) {
  return (
    <FigureKeys
      series={figures.series.map((series) => ({
        index: series.mark,
        open: !series.used,
        name: `${series.key}, ${series.title}${series.used ? '' : `, ${words.out}`}`,
      }))}
      lines={[
        { kind: 'fit', name: words.fit },
        { kind: 'band', name: <Typeset>{words.band}</Typeset> },
        ...(figures.curve.relativeNewLaboratory ? [{ kind: 'prediction' as const, name: words.newLaboratory }] : []),
        ...figures.estimates.map((estimate, i) => ({ kind: estimateStyle(i), name: estimate.method })),
      ]}
    />
  );
}

/** One point in a sentence: where it is, what it says, and how far from the fit. */
function Reading({ figures, id }: { readonly figures: FiguresDataFragment; readonly id: string }) {
  const series = figures.series.find((candidate) =>
    candidate.temperatures.some((_, i) => pointId(candidate.key, i) === id),
  );
  if (series === undefined) return null;
  const index = series.temperatures.findIndex((_, i) => pointId(series.key, i) === id);
  const diffusivity = series.reducedDiffusivities[index]!;
  const leftOut = !series.used || series.leftOut.includes(index);
  return (
    <>
      <b style={{ fontWeight: 600 }}>
        <SeriesKey index={series.mark} open={leftOut} />
        {fill(words.point, { series: series.key, number: index + 1 })}
      </b>
      <span>
        <i>T</i> = <Quantity kind="temperature" value={series.temperatures[index]!} />
      </span>
      <span>
        <i>D</i> ={' '}
        <Quantity
          kind="diffusivity"
          value={diffusivity}
          uncertainty={diffusivity * series.relativeUncertainties[index]!}
        />
      </span>
      <span>{`${formatSigned(series.deviations[index]!, 1)}\u00a0%`}</span>
      {leftOut && <span>{words.leftOut}</span>}
    </>
  );
}
