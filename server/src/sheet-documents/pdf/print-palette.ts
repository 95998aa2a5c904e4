/** Colours of the printed sheet: the day edition on white paper. */
export const printPalette = {
  paper: '#ffffff',
  rule: '#d8d3cb',
  ink: '#1e1813',
  ink2: '#4e463f',
  ink3: '#696058',
  accent: '#71217e',
  warn: '#93400f',
  band: '#e8d0eb',
} as const;

/** Colour and shape of a series; the path is drawn on radius 1, `box` is its width and height. */
export interface SeriesMark {
  readonly colour: string;
  readonly path: string;
  readonly box: readonly [number, number];
}

const SERIES_MARKS: readonly SeriesMark[] = [
  { colour: '#004841', path: 'M-1 0A1 1 0 1 1 1 0A1 1 0 1 1-1 0Z', box: [2, 2] },
  { colour: '#6981f9', path: 'M-.88-.88H.88V.88H-.88Z', box: [1.76, 1.76] },
  { colour: '#af8800', path: 'M0-1.22L1.16.82H-1.16Z', box: [2.32, 2.04] },
  { colour: '#940018', path: 'M0-1.3L1.1 0L0 1.3L-1.1 0Z', box: [2.2, 2.6] },
  { colour: '#009298', path: 'M0 1.22L1.16-.82H-1.16Z', box: [2.32, 2.04] },
  { colour: '#d0457c', path: 'M-.42-1.25H.42V-.42H1.25V.42H.42V1.25H-.42V.42H-1.25V-.42H-.42Z', box: [2.5, 2.5] },
  {
    colour: '#664700',
    path: 'M-1.18-.58L-.58-1.18L0-.6L.58-1.18L1.18-.58L.6 0L1.18.58L.58 1.18L0 .6L-.58 1.18L-1.18.58L-.6 0Z',
    box: [2.36, 2.36],
  },
  { colour: '#587a47', path: 'M-1.1-1.15H1.1L.28 0L1.1 1.15H-1.1L-.28 0Z', box: [2.2, 2.3] },
];
const FIRST_MARK: SeriesMark = { colour: printPalette.ink, path: 'M-1 0A1 1 0 1 1 1 0A1 1 0 1 1-1 0Z', box: [2, 2] };

/** The mark of the series of that number, from 0; after the eighth they come round again, told apart by their letter. */
export const seriesMark = (number: number): SeriesMark => SERIES_MARKS[number % SERIES_MARKS.length] ?? FIRST_MARK;

/** Nine colours at equal steps of OKLab, cold to hot, from 260 K to 460 K; the ends hold beyond. */
const RAMP = [
  '#13377f',
  '#3e3493',
  '#61309b',
  '#802e95',
  '#9b2f87',
  '#b13772',
  '#be475c',
  '#c35e4b',
  '#bf784a',
] as const;
const RAMP_DOMAIN = [260, 460] as const;

/** The colour of a temperature (K). Neighbouring stops lie so close that a straight mix in sRGB cannot be told from OKLab. */
export function temperatureColour(temperature: number): string {
  const [low, high] = RAMP_DOMAIN;
  const place = Math.min(1, Math.max(0, (temperature - low) / (high - low))) * (RAMP.length - 1);
  const index = Math.min(RAMP.length - 2, Math.floor(place));
  const channel = (hex: string | undefined, at: number): number => Number.parseInt((hex ?? '').slice(at, at + 2), 16);
  const mixed = [1, 3, 5].map((at) => {
    const [from, to] = [channel(RAMP[index], at), channel(RAMP[index + 1], at)];
    return Math.round(from + (to - from) * (place - index))
      .toString(16)
      .padStart(2, '0');
  });
  return `#${mixed.join('')}`;
}
