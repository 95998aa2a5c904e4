import { type AxisSpec, type FigurePoint, type FigureSpec } from './spec';

/** The drawing area of one panel, CSS px. */
export interface PanelBox {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

export interface FigureLayout {
  readonly width: number;
  readonly height: number;
  readonly panels: readonly PanelBox[];
}

export const isNarrow = (width: number): boolean => width < 480;

/** Radius of a point: smaller where there is less room. */
export const pointRadius = (width: number): number => (isNarrow(width) ? 2.9 : width < 600 ? 3.2 : 3.7);

const TITLE_ROOM = 30;

/** Where each panel is drawn: the same for the chart, the pointer and the keyboard. */
export function figureLayout(spec: FigureSpec, width: number): FigureLayout {
  const [left, right] = isNarrow(width) ? [40, width - 6] : [58, width - 16];
  let top = 0;
  const panels = spec.panels.map((panel, i) => {
    const height = panel.height(width);
    const isLast = i === spec.panels.length - 1;
    const box = { left, right, top: top + TITLE_ROOM, bottom: top + height - (isLast ? 28 : 10) };
    top += height;
    return box;
  });
  return { width, height: top, panels };
}

export const scaled = (axis: Pick<AxisSpec, 'logarithmic'>, value: number): number =>
  axis.logarithmic ? Math.log(value) : value;

/** Place of a value between the ends of its axis, 0 to 1. */
const share = (axis: AxisSpec, value: number): number =>
  (scaled(axis, value) - scaled(axis, axis.min)) / (scaled(axis, axis.max) - scaled(axis, axis.min));

/** A point placed on the page, CSS px from the top left of the figure. */
export interface PlacedPoint {
  readonly point: FigurePoint;
  readonly panel: number;
  readonly series: number;
  readonly left: number;
  readonly top: number;
}

/** All points of all panels, from left to right. One beyond the scale lies at its edge. */
export function placedPoints(spec: FigureSpec, layout: FigureLayout): PlacedPoint[] {
  const x = spec.x(layout.width);
  const placed = spec.panels.flatMap((panel, index) =>
    panel.marks.flatMap((mark) => {
      if (mark.kind !== 'points') return [];
      const box = layout.panels[index]!;
      return mark.points.map((point) => ({
        point,
        panel: index,
        series: mark.series,
        left: box.left + share(x, point.x) * (box.right - box.left),
        top: box.bottom - clamped(share(panel.y, point.y)) * (box.bottom - box.top),
      }));
    }),
  );
  return placed.sort((a, b) => a.left - b.left);
}

const clamped = (value: number): number => Math.min(1, Math.max(0, value));

const REACH = 24;

/** The point nearest to a place, or null when none is within reach. */
export function nearestPoint(points: readonly PlacedPoint[], left: number, top: number): PlacedPoint | null {
  let nearest: PlacedPoint | null = null;
  let least = REACH;
  for (const candidate of points) {
    const distance = Math.hypot(candidate.left - left, candidate.top - top);
    if (distance < least) [nearest, least] = [candidate, distance];
  }
  return nearest;
}
