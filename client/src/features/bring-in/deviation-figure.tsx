import { type PlainTable } from '../../lib/delimited';
import { fill } from '../../lib/fill';
import { formatShort, formatSigned } from '../../lib/format-quantity';
import { typeset } from '../../lib/typeset';
import { fromSi, type ReaderUnits, unitLabel, useReaderUnits } from '../../lib/units';
import { bringInStrings } from '../../strings/bring-in';
import { Figure } from '../../ui/figure/figure';
import { type FigureSpec } from '../../ui/figure/spec';
import { readerTicks, roundTicks } from '../../ui/figure/ticks';
import { quantityText } from '../../ui/numbers/quantity';
import { Typeset } from '../../ui/numbers/typeset';
import { type ReadAnswer, type UnderstoodPoint } from './answer';
import { percentAgainst } from './cells';

const words = bringInStrings.figure;
/** Beyond so many percent a point becomes an arrow at the edge, so that one slip does not flatten the rest. */
const WIDEST_PERCENT = 40;
const LEAST_PERCENT = 4;

interface Compared {
  readonly row: number;
  readonly point: UnderstoodPoint;
  readonly percent: number;
}

/** The understood points against the estimate of kinetic theory. */
export function DeviationFigure({ answer }: { readonly answer: ReadAnswer }) {
  const units = useReaderUnits();
  const compared = answer.rows.flatMap(({ number, point, estimate, state }): Compared[] =>
    point && estimate !== null && state === 'KEPT'
      ? [{ row: number, point, percent: percentAgainst(point, estimate) }]
      : [],
  );
  if (compared.length === 0 || answer.estimateLabel === null) return null;
  return (
    <Figure
      number={1}
      caption={<Typeset values={{ label: answer.estimateLabel }}>{words.caption}</Typeset>}
      description={fill(words.description, { points: compared.length, label: answer.estimateLabel })}
      spec={deviationSpec(compared, units)}
      data={dataOf(compared)}
      file="brought-in-against-estimate"
      reading={(id) => readingOf(compared, id, units)}
    />
  );
}

function readingOf(compared: readonly Compared[], id: string, units: ReaderUnits): string {
  const found = compared.find(({ row }) => String(row) === id);
  if (found === undefined) return '';
  const { row, point, percent } = found;
  return fill(words.reading, {
    row,
    temperature: quantityText('temperature', point.temperature, units.temperature),
    pressure: quantityText('pressure', point.pressure, units.pressure),
    diffusivity: quantityText('diffusivity', point.diffusivity, units.diffusivity),
    percent: formatSigned(percent, 1),
  });
}

const dataOf = (compared: readonly Compared[]): PlainTable => ({
  head: [words.head.row, words.head.temperature, words.head.pressure, words.head.diffusivity, words.head.percent],
  rows: compared.map(({ row, point, percent }) => [
    row,
    point.temperature,
    point.pressure,
    point.diffusivity,
    Number(percent.toFixed(2)),
  ]),
});

export function deviationSpec(compared: readonly Compared[], units: ReaderUnits): FigureSpec {
  const points = compared.map(({ row, point, percent }) => {
    const u = (100 * (point.diffusivityUncertainty ?? 0)) / point.diffusivity;
    const bar = u > 0 ? { low: percent - u, high: percent + u } : {};
    return { id: String(row), x: point.temperature, y: percent, ...bar };
  });
  const reach = Math.max(LEAST_PERCENT, ...points.map(({ y }) => Math.min(WIDEST_PERCENT, Math.abs(y) * 1.25)));
  const temperatures = points.map(({ x }) => x);
  const [low, high] = [Math.min(...temperatures), Math.max(...temperatures)];
  const room = Math.max(2, (high - low) * 0.06);
  const x = { min: low - room, max: high + room };
  return {
    x: (width) => ({
      ...x,
      // The right end is the axis title's.
      ticks: readerTicks('temperature', x, units.temperature, Math.max(3, Math.floor((width - 120) / 72))).filter(
        (tick) => tick < x.min + (x.max - x.min) * (1 - 56 / width),
      ),
      format: (kelvin) => formatShort(fromSi('temperature', kelvin, units.temperature), 5),
      title: typeset(words.temperature, { unit: unitLabel('temperature', units.temperature) }),
    }),
    panels: [
      {
        height: (width) => (width < 480 ? 210 : 236),
        y: {
          min: -reach,
          max: reach,
          ticks: roundTicks(-reach, reach, 5),
          format: (percent) => formatSigned(percent, Number.isInteger(percent) ? 0 : 1),
          title: typeset(words.deviation),
        },
        marks: [
          {
            kind: 'line',
            style: 'estimate1',
            points: [
              [x.min, 0],
              [x.max, 0],
            ],
          },
          { kind: 'points', series: 0, bars: 'visible', points },
        ],
      },
    ],
    temperatureRule: { low, high },
  };
}
