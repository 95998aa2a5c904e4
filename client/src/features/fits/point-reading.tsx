import { chakra } from '@chakra-ui/react';
import { fill } from '../../lib/fill';
import { formatShort, formatSigned } from '../../lib/format-quantity';
import { fitStrings } from '../../strings/fits';
import { WordButton } from '../../ui/form/button';
import { SeriesKey } from '../../ui/marks/series-key';
import { Quantity } from '../../ui/numbers/quantity';
import { type PairPoint, type PairSeries } from './pair-series';

const words = fitStrings.picture;

interface PointReadingProps {
  readonly series: PairSeries;
  readonly point: PairPoint;
  /** Why the point alone is left out; null when it is not. */
  readonly reason: string | null;
  /** Where the point can be left out or taken in. */
  readonly actions?: {
    readonly held: boolean;
    readonly onAsk: () => void;
    readonly onTakeIn: () => void;
    readonly onLetGo: () => void;
  };
}

/** One point in a sentence: where it is, what it says, how far from the fit, and what can be done with it. */
export function PointReading({ series, point, reason, actions }: PointReadingProps) {
  return (
    <>
      <chakra.b fontWeight={600}>
        <SeriesKey index={series.mark} open={point.open} />
        {fill(words.point, { letter: series.letter, number: point.number })}
      </chakra.b>
      <span>
        <i>T</i> = <Quantity kind="temperature" value={point.temperature} />
      </span>
      <span>
        <i>P</i> = <Quantity kind="pressure" value={point.pressure} />
      </span>
      <span>
        <i>D</i> = <Quantity kind="diffusivity" value={point.diffusivity} uncertainty={point.uncertainty} />
      </span>
      {point.deviation !== null && <span>{formatSigned(100 * point.deviation, 1)}&nbsp;%</span>}
      {point.residual !== null && (
        <span>
          {formatSigned(point.residual, 1)}&nbsp;<i>u</i>
        </span>
      )}
      {!point.open && point.weight !== 1 && <span>{fill(words.robust, { weight: formatShort(point.weight, 2) })}</span>}
      {series.status === 'SUBMITTED' && <span>{words.waiting}</span>}
      {reason !== null && <span>{`${words.leftOut}, ${reason}`}</span>}
      {actions && series.carriesWeight && (
        <WordButton onClick={actions.onAsk}>{reason === null ? words.exclude : words.change}</WordButton>
      )}
      {actions && series.carriesWeight && reason !== null && (
        <WordButton onClick={actions.onTakeIn}>{words.takeIn}</WordButton>
      )}
      {actions?.held && (
        <WordButton quiet onClick={actions.onLetGo}>
          {words.letGo}
        </WordButton>
      )}
    </>
  );
}
