import { chakra } from '@chakra-ui/react';
import { seriesMark, seriesMarks } from '../theme/palette';

interface SeriesKeyProps {
  /** Number of the series, from 0: its colour and shape. */
  readonly index: number;
  /** Left out: the shape is open. */
  readonly open?: boolean;
}

const RADIUS = 5;

/** The shape of a series: filled where it carries weight, open where it is left out. Its name stands beside it. */
export const SeriesKey = ({ index, open = false }: SeriesKeyProps) => (
  <chakra.svg
    width="16px"
    height="16px"
    viewBox="-8 -8 16 16"
    aria-hidden
    display="inline"
    verticalAlign="-3px"
    marginRight="5px"
  >
    <SeriesShape index={index} open={open} radius={RADIUS} />
  </chakra.svg>
);

/** The same shape inside another drawing, centred on its origin. */
export const SeriesShape = ({ index, open = false, radius }: SeriesKeyProps & { readonly radius: number }) => {
  const colour = `series.${(index % seriesMarks.length) + 1}`;
  return (
    <chakra.path
      d={seriesMark(index).path}
      transform={`scale(${radius})`}
      fill={open ? 'paper' : colour}
      stroke={open ? colour : 'none'}
      strokeWidth={1.3 / radius}
    />
  );
};
