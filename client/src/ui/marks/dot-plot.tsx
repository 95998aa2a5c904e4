import { chakra } from '@chakra-ui/react';
import { SeriesShape } from './series-key';

interface DotPlotProps {
  /** All in one unit, as `from` and `to`. */
  readonly value: number;
  readonly halfWidth: number;
  /** Half-width of the tint around zero. */
  readonly band: number;
  readonly from: number;
  readonly to: number;
  readonly width?: number;
  /** The shape of a series; a plain dot when absent. */
  readonly series?: number;
  readonly label: string;
}

const HEIGHT = 18;

/** One value with its bar against a band around zero, on a scale that its rows share. Beyond the scale it stays at the edge. */
export function DotPlot({ value, halfWidth, band, from, to, width = 78, series, label }: DotPlotProps) {
  const x = (v: number) => 5 + ((Math.min(to, Math.max(from, v)) - from) / (to - from)) * (width - 10);
  return (
    <chakra.svg
      width={`${width}px`}
      height={`${HEIGHT}px`}
      viewBox={`0 0 ${width} ${HEIGHT}`}
      role="img"
      aria-label={label}
      display="inline-block"
      verticalAlign="-4px"
    >
      <chakra.rect fill="band" x={x(-band)} width={Math.max(0, x(band) - x(-band))} y="3" height="12" />
      <chakra.line stroke="accent" strokeWidth="1.4" x1={x(0)} x2={x(0)} y1="1" y2="17" />
      <chakra.line stroke="ink" strokeWidth="1.3" x1={x(value - halfWidth)} x2={x(value + halfWidth)} y1="9" y2="9" />
      {series === undefined ? (
        <chakra.circle fill="ink" cx={x(value)} cy="9" r="3.2" />
      ) : (
        <g transform={`translate(${x(value)} 9)`}>
          <SeriesShape index={series} radius={4.4} />
        </g>
      )}
    </chakra.svg>
  );
}
