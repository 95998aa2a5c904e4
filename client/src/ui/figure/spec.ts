import { type TextRun } from '../../lib/typeset';

/** An axis. Numbers are in one unit throughout (SI); `format` prints them in the reader's. */
export interface AxisSpec {
  readonly min: number;
  readonly max: number;
  readonly logarithmic?: boolean;
  readonly ticks: readonly number[];
  readonly format: (value: number) => string;
  /** Quantity / unit, typeset. */
  readonly title: readonly TextRun[];
  /** Of a list of names: no lines across. */
  readonly bare?: boolean;
}

export type LineStyle = 'fit' | 'outside' | 'prediction' | 'estimate1' | 'estimate2' | 'estimate3' | 'zero';

/** A curve through its points. */
export interface LineMark {
  readonly kind: 'line';
  readonly style: LineStyle;
  readonly points: readonly (readonly [x: number, y: number])[];
}

/** A tint between two curves: U of the recommended value, an older U, or ±2u. */
export interface BandMark {
  readonly kind: 'band';
  readonly tone: 'recommended' | 'older' | 'tint';
  readonly x: readonly number[];
  readonly low: readonly number[];
  readonly high: readonly number[];
}

/** One point of a series. The same `id` in two panels is the same point. */
export interface FigurePoint {
  readonly id: string;
  readonly x: number;
  readonly y: number;
  /** Ends of the bar, ±u. */
  readonly low?: number;
  readonly high?: number;
  /** Carries no weight: drawn open. */
  readonly open?: boolean;
}

/** The points of one series in its colour and shape. One beyond the scale becomes an arrow with its value. */
export interface PointsMark {
  readonly kind: 'points';
  /** Number of the series, from 0. */
  readonly series: number;
  readonly points: readonly FigurePoint[];
  /** Every bar, or only those that their point does not hide. */
  readonly bars: 'all' | 'visible';
}

/** How far one series reaches in temperature: coloured by temperature, or broken where it carries no weight. */
export interface ExtentMark {
  readonly kind: 'extent';
  readonly y: number;
  /** K */
  readonly low: number;
  readonly high: number;
  readonly open: boolean;
}

/** Words inside the drawing. */
export interface LabelMark {
  readonly kind: 'label';
  readonly x: number;
  readonly y: number;
  readonly text: string;
  readonly tone: 'note' | 'accent';
  readonly anchor: 'left' | 'right';
  /** CSS px from the place. */
  readonly dx: number;
  readonly dy: number;
  /** Left away on a narrow screen. */
  readonly wideOnly?: boolean;
}

export type Mark = LineMark | BandMark | PointsMark | ExtentMark | LabelMark;

export interface PanelSpec {
  /** CSS px, axis title and tick labels included. */
  readonly height: (width: number) => number;
  readonly y: AxisSpec;
  readonly marks: readonly Mark[];
}

/** Panels stacked on one x axis; only the lowest carries its figures and the temperature rule. */
export interface FigureSpec {
  /** Ticks for the width at hand. */
  readonly x: (width: number) => AxisSpec;
  readonly panels: readonly PanelSpec[];
  /** Where the correlation holds, K. Only for a temperature axis in K. */
  readonly temperatureRule?: { readonly low: number; readonly high: number };
}
