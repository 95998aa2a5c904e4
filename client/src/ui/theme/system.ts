import { createSystem, defaultBaseConfig, defineConfig, defineSemanticTokens, defineTokens } from '@chakra-ui/react';
import { globalCss } from './global-css';
import { fontFamily, monoFamily, palette, seriesMarks, temperatureRamp, type EditionColour } from './palette';
import { textStyles } from './text-styles';

const token = ({ day, night }: EditionColour) => ({ value: { base: day, _dark: night } });

const colors = defineSemanticTokens.colors({
  ...Object.fromEntries(Object.entries(palette).map(([name, colour]) => [name, token(colour)])),
  series: Object.fromEntries(seriesMarks.map((mark, index) => [String(index + 1), token(mark)])),
  ramp: Object.fromEntries(
    temperatureRamp.day.map((day, index) => [String(index), token({ day, night: temperatureRamp.night[index]! })]),
  ),
});

const tokens = defineTokens({
  fonts: { body: { value: fontFamily }, heading: { value: fontFamily }, mono: { value: monoFamily } },
  radii: { control: { value: '2px' } },
});

/**
 * Diffolio's own system on Chakra's machinery alone: none of Chakra's tokens, recipes, shadows, rings or radii come in.
 * Below `md` a page is one column; from `lg` it has its full margin; from `xl` it stays 1440 px, centred.
 */
export const system = createSystem(
  defaultBaseConfig,
  defineConfig({
    cssVarsPrefix: 'dfl',
    preflight: true,
    globalCss,
    theme: {
      breakpoints: { sm: '40rem', md: '56.3125rem', lg: '80rem', xl: '90.0625rem' },
      tokens,
      semanticTokens: { colors },
      textStyles,
    },
  }),
);
