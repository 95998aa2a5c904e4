import { defineGlobalStyles } from '@chakra-ui/react';

/** What holds for every page: paper and ink, links in ink with an iodine underline, sub- and superscripts, focus. */
export const globalCss = defineGlobalStyles({
  html: { background: 'paper', textSizeAdjust: '100%', scrollPaddingTop: '64px' },
  body: {
    background: 'paper',
    color: 'ink',
    fontFamily: 'body',
    textStyle: 'body',
    fontFeatureSettings: '"kern", "liga"',
    textRendering: 'optimizeLegibility',
  },
  a: {
    color: 'inherit',
    textDecoration: 'underline',
    textDecorationColor: 'accent',
    textDecorationThickness: '1px',
    textUnderlineOffset: '3px',
    _hover: { color: 'accent' },
  },
  ':focus-visible': { outline: '2px solid', outlineColor: 'accent', outlineOffset: '2px', borderRadius: '1px' },
  'sup, sub': {
    fontSize: '0.68em',
    lineHeight: 0,
    position: 'relative',
    verticalAlign: 'baseline',
    fontFeatureSettings: '"tnum"',
  },
  sup: { top: '-0.44em' },
  sub: { top: '0.22em', marginLeft: '0.04em' },
  'i, em': { fontStyle: 'italic' },
  'button, input, select, textarea': { font: 'inherit', color: 'inherit' },
  'input::placeholder, textarea::placeholder': { color: 'ink3', opacity: 1 },
  ins: { textDecoration: 'underline double 1px', textUnderlineOffset: '3px' },
  del: { color: 'ink3', textDecoration: 'line-through' },
  code: { fontFamily: 'mono', fontSize: '12.5px', lineHeight: '20px' },
  'a, button': { _motionSafe: { transition: 'color 120ms, border-color 120ms' } },
  '*, *::before, *::after': {
    _motionReduce: { animationDuration: '0.01ms !important', transitionDuration: '0.01ms !important' },
  },
});
