import { defineRecipe, defineSlotRecipe } from '@chakra-ui/react';

export const buttonRecipe = defineRecipe({
  base: {
    display: 'inline-block',
    textStyle: 'control',
    fontWeight: 550,
    padding: '6px 16px',
    border: '1px solid',
    borderColor: 'control',
    borderRadius: 'control',
    background: 'none',
    color: 'ink',
    textDecoration: 'none',
    whiteSpace: 'nowrap',
    cursor: 'pointer',
    _hover: { borderColor: 'accent', color: 'accent' },
    '&[aria-busy=true]': { cursor: 'progress' },
  },
  variants: {
    kind: {
      plain: {},
      // The one thing a screen asks for.
      primary: {
        background: 'accent',
        borderColor: 'accent',
        color: 'onAccent',
        _hover: { color: 'onAccent', textDecoration: 'underline' },
      },
      // Not yet possible: can be reached and asked why, but does nothing.
      waiting: {
        borderStyle: 'dashed',
        color: 'ink3',
        cursor: 'not-allowed',
        _hover: { color: 'ink3', borderColor: 'control' },
      },
    },
    size: { normal: {}, small: { fontSize: '14px', lineHeight: '22px', padding: '4px 12px' } },
  },
  defaultVariants: { kind: 'plain', size: 'normal' },
});

/** A button that reads as a word of the text: tools of a figure, views, “show”. */
export const wordButtonRecipe = defineRecipe({
  base: {
    background: 'none',
    cursor: 'pointer',
    textDecoration: 'underline',
    textDecorationColor: 'accent',
    textDecorationThickness: '1px',
    textUnderlineOffset: '3px',
    minHeight: '24px',
    _hover: { color: 'accent' },
  },
  variants: { quiet: { true: { textDecorationColor: 'rule' } } },
});

const underline = {
  borderBottom: '1.5px solid',
  borderColor: 'control',
  '&:focus-within': { borderColor: 'accent', boxShadow: '0 1px 0 var(--dfl-colors-accent)' },
};

const arrow = {
  appearance: 'none',
  paddingRight: '15px',
  paddingLeft: '5px',
  cursor: 'pointer',
  backgroundColor: 'transparent',
  backgroundRepeat: 'no-repeat',
  backgroundImage:
    'linear-gradient(45deg, transparent 50%, var(--dfl-colors-ink2) 50%), linear-gradient(-45deg, transparent 50%, var(--dfl-colors-ink2) 50%)',
  backgroundSize: '5px 5px, 5px 5px',
  backgroundPosition: 'right 5px top 58%, right 1px top 58%',
  '& option': { color: 'ink', background: 'paper' },
} as const;

export const fieldRecipe = defineSlotRecipe({
  slots: ['root', 'label', 'frame', 'control', 'select', 'area', 'inside', 'hint', 'error'],
  base: {
    root: { minWidth: 0 },
    label: { display: 'block', fontSize: '13px', lineHeight: '18px', color: 'ink2' },
    frame: { ...underline, position: 'relative', display: 'flex', alignItems: 'baseline', gap: '6px' },
    control: {
      flex: 1,
      minWidth: 0,
      width: '100%',
      background: 'none',
      fontSize: '17px',
      lineHeight: '28px',
      padding: '3px 0',
      _focusVisible: { outline: 'none' },
    },
    select: {
      ...arrow,
      flex: 1,
      minWidth: 0,
      paddingLeft: 0,
      fontSize: '15px',
      lineHeight: '28px',
      paddingBlock: '3px',
      _focusVisible: { outline: 'none' },
    },
    area: {
      width: '100%',
      minHeight: '72px',
      padding: '8px 10px',
      marginTop: '4px',
      textStyle: 'small',
      background: 'none',
      border: '1px solid',
      borderColor: 'control',
      borderRadius: 'control',
      display: 'block',
    },
    inside: { fontSize: '13px', color: 'ink2', whiteSpace: 'nowrap' },
    hint: { textStyle: 'caption', color: 'ink2', marginTop: '4px' },
    error: { textStyle: 'small', color: 'warn', marginTop: '4px' },
  },
  variants: {
    size: {
      normal: {},
      small: {
        control: { fontSize: '15px', lineHeight: '24px', padding: '1px 0' },
        select: { lineHeight: '24px', paddingBlock: '1px' },
      },
    },
    invalid: { true: { frame: { borderColor: 'warn' }, area: { borderColor: 'warn' } } },
  },
  defaultVariants: { size: 'normal' },
});

/** A field inside a sentence, its unit within the same underline. */
export const sentenceFieldRecipe = defineSlotRecipe({
  slots: ['frame', 'input', 'select'],
  base: {
    frame: { ...underline, display: 'inline-flex', alignItems: 'baseline', lineHeight: '28px' },
    input: {
      width: '90px',
      padding: '0 2px',
      background: 'none',
      textAlign: 'right',
      fontFeatureSettings: '"tnum"',
      _focusVisible: { outline: 'none' },
    },
    select: { ...arrow, _focusVisible: { outline: 'none' } },
  },
  variants: { invalid: { true: { frame: { borderColor: 'warn' } } } },
});

/** Underlined words to choose one of, and filters led by a preposition. */
export const viewsRecipe = defineSlotRecipe({
  slots: ['root', 'option', 'space', 'label'],
  base: {
    root: {
      display: 'flex',
      flexWrap: { base: 'nowrap', md: 'wrap' },
      overflowX: { base: 'auto', md: 'visible' },
      gap: { base: '18px', md: '24px' },
      textStyle: 'small',
      marginTop: '12px',
      borderBottom: '1px solid',
      borderColor: 'rule',
    },
    option: {
      background: 'none',
      cursor: 'pointer',
      color: 'ink2',
      whiteSpace: 'nowrap',
      padding: { base: '9px 0 11px', md: '4px 0 6px' },
      borderBottom: '2px solid transparent',
      marginBottom: '-1px',
      _hover: { color: 'accent' },
      '&[aria-selected=true], &[aria-pressed=true]': { color: 'ink', fontWeight: 600, borderBottomColor: 'accent' },
    },
    space: { flex: 1 },
    label: { color: 'ink3' },
  },
  variants: {
    kind: {
      views: {},
      filters: {
        root: {
          flexWrap: 'wrap',
          overflowX: 'visible',
          gap: '2px 16px',
          alignItems: 'baseline',
          border: 'none',
          marginTop: 0,
          color: 'ink2',
          lineHeight: { base: '34px', md: '24px' },
        },
        option: { padding: '1px 0', marginBottom: 0 },
      },
    },
  },
  defaultVariants: { kind: 'views' },
});
