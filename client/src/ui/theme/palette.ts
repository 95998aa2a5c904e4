/** A colour in the day edition and in the night edition. */
export interface EditionColour {
  readonly day: string;
  readonly night: string;
}
export type Edition = keyof EditionColour;

/** The colours of the page. What each is for stands beside it; contrasts on paper are 5.7 or more for text. */
export const palette = {
  /** page */
  paper: { day: '#fbf7f0', night: '#1b1612' },
  /** row under the pointer, code, reading pane */
  sunk: { day: '#f4efe4', night: '#251f1a' },
  /** hairlines and chart grid: decoration only */
  rule: { day: '#d1c9be', night: '#443d36' },
  /** edges of fields, boxes, progress */
  control: { day: '#837a71', night: '#877f75' },
  ink: { day: '#1e1813', night: '#ece6d9' },
  /** captions, secondary text, axis figures */
  ink2: { day: '#4e463f', night: '#c4bdb0' },
  /** labels in the margin, section numbers, estimate curves */
  ink3: { day: '#696058', night: '#a29a8e' },
  /** what Diffolio stands behind or asks for */
  accent: { day: '#71217e', night: '#e09fea' },
  accentTint: { day: '#f2e6f4', night: '#37233a' },
  onAccent: { day: '#fcfaf4', night: '#1c111e' },
  /** warnings and withdrawn, always with mark and word */
  warn: { day: '#93400f', night: '#f2a866' },
  warnTint: { day: '#fde9d5', night: '#3e2815' },
  /** U of the recommended value */
  band: { day: '#e8d0eb', night: '#4e3053' },
} as const satisfies Record<string, EditionColour>;

/** Colour and shape of one series, everywhere the same. `path` is drawn on radius 1; `box` is its width and height. */
export interface SeriesMark extends EditionColour {
  readonly shape: string;
  readonly path: string;
  readonly box: readonly [number, number];
}

export const seriesMarks: readonly SeriesMark[] = [
  { day: '#004841', night: '#7ae9ce', shape: 'disc', path: 'M-1 0A1 1 0 1 1 1 0A1 1 0 1 1-1 0Z', box: [2, 2] },
  { day: '#6981f9', night: '#6461da', shape: 'square', path: 'M-.88-.88H.88V.88H-.88Z', box: [1.76, 1.76] },
  { day: '#af8800', night: '#c7dc88', shape: 'triangle up', path: 'M0-1.22L1.16.82H-1.16Z', box: [2.32, 2.04] },
  { day: '#940018', night: '#a76100', shape: 'diamond', path: 'M0-1.3L1.1 0L0 1.3L-1.1 0Z', box: [2.2, 2.6] },
  { day: '#009298', night: '#3b969a', shape: 'triangle down', path: 'M0 1.22L1.16-.82H-1.16Z', box: [2.32, 2.04] },
  {
    day: '#d0457c',
    night: '#9d5f72',
    shape: 'plus',
    path: 'M-.42-1.25H.42V-.42H1.25V.42H.42V1.25H-.42V.42H-1.25V-.42H-.42Z',
    box: [2.5, 2.5],
  },
  {
    day: '#664700',
    night: '#dd9e00',
    shape: 'saltire',
    path: 'M-1.18-.58L-.58-1.18L0-.6L.58-1.18L1.18-.58L.6 0L1.18.58L.58 1.18L0 .6L-.58 1.18L-1.18.58L-.6 0Z',
    box: [2.36, 2.36],
  },
  {
    day: '#587a47',
    night: '#6f925e',
    shape: 'hourglass',
    path: 'M-1.1-1.15H1.1L.28 0L1.1 1.15H-1.1L-.28 0Z',
    box: [2.2, 2.3],
  },
];

/** The mark of series `index` (from 0); after the eighth they come round again. */
export const seriesMark = (index: number): SeriesMark =>
  seriesMarks[((index % seriesMarks.length) + seriesMarks.length) % seriesMarks.length]!;

/** Nine stops at equal distance in OKLab, cold to hot, over the temperatures of `domain` in K. */
export const temperatureRamp = {
  domain: [260, 460],
  day: ['#13377f', '#3e3493', '#61309b', '#802e95', '#9b2f87', '#b13772', '#be475c', '#c35e4b', '#bf784a'],
  night: ['#5073b5', '#7474ca', '#9874d2', '#ba74cf', '#d878c2', '#ef81af', '#fd909d', '#ffa695', '#ffbd94'],
} as const;

export const fontFamily = '"Work Sans Variable", "Diffolio Symbols", sans-serif';
/** Without inner quotes: quotes would break the attribute of a chart's SVG. */
export const chartFontFamily = 'Work Sans Variable, Diffolio Symbols, sans-serif';
export const monoFamily = 'ui-monospace, "Liberation Mono", "DejaVu Sans Mono", monospace';
