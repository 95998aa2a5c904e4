import { palette, seriesMark, type Edition } from '../theme/palette';

/** The colours of one edition, as a chart needs them: plain values, because a saved picture has no style sheet. */
export interface Look {
  readonly edition: Edition;
  readonly paper: string;
  readonly rule: string;
  readonly ink: string;
  readonly ink2: string;
  readonly ink3: string;
  readonly accent: string;
  readonly accentTint: string;
  readonly band: string;
  readonly series: (index: number) => string;
}

const lookOf = (edition: Edition): Look => ({
  edition,
  paper: palette.paper[edition],
  rule: palette.rule[edition],
  ink: palette.ink[edition],
  ink2: palette.ink2[edition],
  ink3: palette.ink3[edition],
  accent: palette.accent[edition],
  accentTint: palette.accentTint[edition],
  band: palette.band[edition],
  series: (index) => seriesMark(index)[edition],
});

export const looks: Readonly<Record<Edition, Look>> = { day: lookOf('day'), night: lookOf('night') };
/** For what leaves the page: day colours on white paper. */
export const printedLook: Look = { ...looks.day, paper: '#ffffff', rule: '#d8d3cb' };
