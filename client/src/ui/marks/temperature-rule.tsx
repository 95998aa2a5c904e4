import { chakra } from '@chakra-ui/react';
import { useId, type KeyboardEvent, type PointerEvent } from 'react';
import { type Edition } from '../theme/palette';
import { temperatureColour } from '../temperature-ramp';
import { useElementWidth } from '../use-element-width';

interface RampProps {
  /** K: where the correlation holds. */
  readonly low: number;
  readonly high: number;
  readonly x: (temperature: number) => number;
  readonly y: number;
  readonly edition: Edition;
}

const STOPS = 13;

/** The coloured band, 5 px high, between two temperatures of a drawing. */
export function Ramp({ low, high, x, y, edition }: RampProps) {
  const id = useId();
  const [start, end] = [x(low), x(high)];
  const stops = Array.from({ length: STOPS }, (_, i) => low + ((high - low) * i) / (STOPS - 1));
  return (
    <>
      <linearGradient id={id} gradientUnits="userSpaceOnUse" x1={start} x2={end} y1={0} y2={0}>
        {stops.map((t) => (
          <stop
            key={t}
            offset={end > start ? (x(t) - start) / (end - start) : 0}
            stopColor={temperatureColour(t, edition)}
          />
        ))}
      </linearGradient>
      <rect
        x={start}
        y={y - 2.5}
        width={Math.max(0, end - start)}
        height={5}
        fill={`url(#${id})`}
        shapeRendering="crispEdges"
      />
    </>
  );
}

interface TemperatureRuleProps {
  /** K: the validity range. */
  readonly low: number;
  readonly high: number;
  /** K: what the caret points at; with `onChange` it can be dragged and moved by the arrow keys. */
  readonly at: number | null;
  readonly onChange?: (temperature: number) => void;
  readonly edition: Edition;
  /** Prints a temperature in the reader's unit. */
  readonly format: (temperature: number) => string;
  readonly label: string;
}

const HEIGHT = 44;
const AXIS = 17;

/** The temperature axis, coloured only where the correlation holds, with a caret at the temperature asked for. */
export function TemperatureRule({ low, high, at, onChange, edition, format, label }: TemperatureRuleProps) {
  const [width, ref] = useElementWidth(896);
  const { from, to, ticks } = ruleScale(low, high, width);
  const x = (t: number) => 1 + ((t - from) / (to - from)) * (width - 2);
  const shown = at === null ? null : Math.min(to, Math.max(from, at));
  const step = (by: number) => onChange?.(Math.round(((shown ?? low) + by) * 100) / 100);
  const keys = (event: KeyboardEvent) => {
    const by = keyStep(event);
    if (by === null) return;
    event.preventDefault();
    step(by);
  };
  const point = (event: PointerEvent<SVGSVGElement>) => {
    if (event.type === 'pointerdown') event.currentTarget.setPointerCapture(event.pointerId);
    else if (!event.currentTarget.hasPointerCapture(event.pointerId)) return;
    const box = event.currentTarget.getBoundingClientRect();
    onChange?.(Math.round(from + ((event.clientX - box.left) / box.width) * (to - from)));
  };
  return (
    <chakra.div
      ref={ref}
      marginTop="14px"
      role="slider"
      tabIndex={0}
      aria-label={label}
      aria-valuemin={Math.round(from)}
      aria-valuemax={Math.round(to)}
      aria-valuenow={shown ?? Math.round(low)}
      aria-valuetext={format(shown ?? low)}
      onKeyDown={keys}
      touchAction="pan-y"
    >
      <chakra.svg
        width={width}
        height={`${HEIGHT}px`}
        viewBox={`0 0 ${width} ${HEIGHT}`}
        display="block"
        overflow="visible"
        cursor="ew-resize"
        aria-hidden
        onPointerDown={point}
        onPointerMove={point}
        fontSize="12px"
        fontFeatureSettings='"tnum"'
      >
        <rect x="0" y="0" width={width} height={HEIGHT} fill="transparent" />
        <chakra.line stroke="ink" x1="0" x2={width} y1={AXIS} y2={AXIS} shapeRendering="crispEdges" />
        <Ramp low={low} high={high} x={x} y={AXIS} edition={edition} />
        {[low, high].map((t) => (
          <chakra.line key={t} stroke="ink" strokeWidth="1.4" x1={x(t)} x2={x(t)} y1={AXIS - 6} y2={AXIS + 6} />
        ))}
        {ticks.map((t) => (
          <g key={t}>
            <chakra.line stroke="ink" x1={x(t)} x2={x(t)} y1={AXIS + 3} y2={AXIS + 7} shapeRendering="crispEdges" />
            <chakra.text fill="ink2" x={x(t)} y={AXIS + 21} textAnchor="middle">
              {format(t).split('\u00a0')[0]}
            </chakra.text>
          </g>
        ))}
        {shown !== null && <chakra.path fill="accent" d={`M${x(shown)} ${AXIS - 3}l-5.5-10h11z`} />}
      </chakra.svg>
    </chakra.div>
  );
}

function keyStep(event: KeyboardEvent): number | null {
  const size = event.shiftKey ? 10 : 1;
  if (event.key === 'ArrowRight' || event.key === 'ArrowUp') return size;
  if (event.key === 'ArrowLeft' || event.key === 'ArrowDown') return -size;
  if (event.key === 'PageUp') return 10;
  return event.key === 'PageDown' ? -10 : null;
}

/** A round scale that shows a little beyond the range on both sides. */
export function ruleScale(low: number, high: number, width: number): { from: number; to: number; ticks: number[] } {
  const margin = Math.max(20, (high - low) * 0.15);
  const most = Math.max(3, Math.floor(width / 64));
  const step = [10, 20, 25, 50, 100, 200, 250, 500, 1000].find((s) => (high - low + 2 * margin) / s <= most) ?? 2000;
  const from = Math.max(0, Math.floor((low - margin) / step) * step);
  const to = Math.ceil((high + margin) / step) * step;
  return { from, to, ticks: Array.from({ length: Math.round((to - from) / step) + 1 }, (_, i) => from + i * step) };
}

interface ExtentProps {
  readonly low: number;
  readonly high: number;
  readonly from: number;
  readonly to: number;
  readonly edition: Edition;
  readonly label: string;
}

const LIST_WIDTH = 118;

/** The extent of a sheet in a list, on a common scale; an arrow where it runs on beyond the scale. */
export function ExtentRule({ low, high, from, to, edition, label }: ExtentProps) {
  const x = (t: number) => 1 + ((Math.min(to, Math.max(from, t)) - from) / (to - from)) * (LIST_WIDTH - 2);
  const beyond = high > to;
  const end = beyond ? to - (to - from) * 0.05 : high;
  return (
    <chakra.svg
      width={`${LIST_WIDTH}px`}
      height="14px"
      viewBox={`0 0 ${LIST_WIDTH} 14`}
      role="img"
      aria-label={label}
      display="inline-block"
      verticalAlign="-2px"
    >
      <chakra.line stroke="rule" x1="0" x2={LIST_WIDTH} y1="7" y2="7" shapeRendering="crispEdges" />
      <Ramp low={Math.max(from, low)} high={Math.max(low, end)} x={x} y={7} edition={edition} />
      {beyond && (
        <chakra.path
          fill="none"
          stroke="ramp.8"
          strokeWidth="1.6"
          d={`M${LIST_WIDTH - 6} 2.5L${LIST_WIDTH - 2} 7L${LIST_WIDTH - 6} 11.5`}
        />
      )}
    </chakra.svg>
  );
}

/** The scale of a list of extents, for its head. */
export function ExtentScale({
  from,
  to,
  ticks,
  format,
}: {
  readonly from: number;
  readonly to: number;
  readonly ticks: readonly number[];
  readonly format: (t: number) => string;
}) {
  const x = (t: number) => 1 + ((t - from) / (to - from)) * (LIST_WIDTH - 2);
  return (
    <chakra.svg
      width={`${LIST_WIDTH}px`}
      height="18px"
      viewBox={`0 0 ${LIST_WIDTH} 18`}
      aria-hidden
      display="block"
      overflow="visible"
      marginTop="3px"
      fontSize="12px"
      fontFeatureSettings='"tnum"'
    >
      {ticks.map((t) => (
        <g key={t}>
          <chakra.text fill="ink2" x={x(t)} y="10" textAnchor="middle">
            {format(t)}
          </chakra.text>
          <chakra.line stroke="ink" x1={x(t)} x2={x(t)} y1="13" y2="18" shapeRendering="crispEdges" />
        </g>
      ))}
    </chakra.svg>
  );
}
