import { defineSlotRecipe } from '@chakra-ui/react';

export const bannerRecipe = defineSlotRecipe({
  slots: ['root', 'mark', 'words'],
  base: {
    root: {
      display: 'grid',
      gridTemplateColumns: { base: '1fr', md: '230px minmax(0, 1fr)' },
      gap: '2px 24px',
      padding: '12px 0',
      marginTop: '14px',
      borderBlock: '1px solid',
      borderColor: 'ink',
      textStyle: 'control',
      '& b': { fontWeight: 600 },
    },
    mark: {},
    words: { maxWidth: '640px' },
  },
  variants: {
    tone: {
      ruled: {},
      warning: {
        root: {
          borderColor: 'warn',
          background: 'warnTint',
          padding: '12px 16px',
          marginInline: { base: 0, md: '-16px' },
        },
      },
    },
  },
  defaultVariants: { tone: 'ruled' },
});

export const evaluatorRecipe = defineSlotRecipe({
  slots: ['root', 'line', 'pair', 'answer', 'sub'],
  base: {
    root: { marginTop: '30px', borderBlock: '1px solid', borderColor: 'ink', padding: '20px 0 14px' },
    line: {
      display: 'flex',
      flexWrap: 'wrap',
      alignItems: 'baseline',
      gap: { base: '6px 10px', md: '10px' },
      textStyle: { base: 'evaluatorSmall', md: 'evaluator' },
      fontFeatureSettings: '"tnum"',
    },
    pair: { whiteSpace: 'nowrap' },
    answer: { color: 'accent', fontWeight: 600, whiteSpace: 'nowrap', '&[aria-busy=true]': { opacity: 0.6 } },
    sub: {
      textStyle: 'small',
      color: 'ink2',
      display: 'flex',
      flexWrap: 'wrap',
      gap: '2px 20px',
      marginTop: '4px',
      minHeight: '22px',
      '& b': { fontWeight: 500, color: 'ink' },
      '& > *': { whiteSpace: { base: 'normal', md: 'nowrap' } },
    },
  },
});

export const figureRecipe = defineSlotRecipe({
  slots: ['root', 'bar', 'caption', 'tools', 'plot', 'reading', 'keys', 'line', 'data'],
  base: {
    root: { marginTop: '20px' },
    bar: {
      display: { base: 'block', md: 'flex' },
      justifyContent: 'space-between',
      gap: '24px',
      alignItems: 'baseline',
      marginBottom: '14px',
    },
    caption: {
      flex: 1,
      textStyle: 'caption',
      color: 'ink2',
      maxWidth: '720px',
      '& b': { fontWeight: 600, color: 'ink' },
    },
    tools: {
      textStyle: 'caption',
      lineHeight: { base: '32px', md: '24px' },
      color: 'ink2',
      display: 'flex',
      gap: { base: '22px', md: '16px' },
      whiteSpace: 'nowrap',
    },
    plot: { position: 'relative', '& svg': { display: 'block', overflow: 'visible' } },
    reading: {
      display: 'flex',
      flexWrap: 'wrap',
      gap: '2px 17px',
      textStyle: 'small',
      minHeight: '22px',
      fontFeatureSettings: '"tnum"',
    },
    keys: {
      display: 'flex',
      flexWrap: 'wrap',
      gap: '2px 20px',
      fontSize: '13px',
      lineHeight: '22px',
      color: 'ink2',
      marginTop: '6px',
      listStyle: 'none',
    },
    line: {
      display: 'inline-block',
      width: '22px',
      borderTop: '2px solid',
      borderColor: 'accent',
      verticalAlign: '4px',
      marginRight: '6px',
      '&[data-kind=band]': { borderTopWidth: '9px', borderColor: 'band', verticalAlign: 0 },
      '&[data-kind=prediction]': { borderTopStyle: 'dotted' },
      '&[data-kind=estimate1]': { borderTopWidth: '1.3px', borderColor: 'ink3' },
      '&[data-kind=estimate2]': { borderTopStyle: 'dashed', borderColor: 'ink3', width: '26px' },
      '&[data-kind=estimate3]': { borderTopStyle: 'dotted', borderColor: 'ink3' },
    },
    data: { marginTop: '14px', maxHeight: '420px', overflow: 'auto' },
  },
});

export const codeRecipe = defineSlotRecipe({
  slots: ['root'],
  base: {
    root: {
      textStyle: 'code',
      fontFamily: 'mono',
      background: 'sunk',
      marginTop: '14px',
      padding: '14px 18px',
      overflowX: 'auto',
      borderBlock: '1px solid',
      borderColor: 'rule',
      tabSize: 2,
      whiteSpace: 'pre',
      '& .comment': { color: 'ink2' },
      '& b': { fontWeight: 700, color: 'accent' },
    },
  },
});

/** A secret shown once: iodine rule above, the key on the accent tint. */
export const shownOnceRecipe = defineSlotRecipe({
  slots: ['root', 'row', 'key'],
  base: {
    root: {
      marginTop: '14px',
      borderTop: '1.5px solid',
      borderTopColor: 'accent',
      borderBottom: '1px solid',
      borderBottomColor: 'rule',
      padding: '12px 0 14px',
      textStyle: 'control',
      '& b': { fontWeight: 600 },
    },
    row: { display: 'flex', gap: '14px', alignItems: 'center', marginTop: '8px', flexWrap: 'wrap' },
    key: {
      fontFamily: 'mono',
      fontSize: '15px',
      lineHeight: '24px',
      background: 'accentTint',
      padding: '6px 12px',
      overflowWrap: 'anywhere',
    },
  },
});

/** What waits, or what will happen: when, what and why, what to do. */
export const agendaRecipe = defineSlotRecipe({
  slots: ['root', 'item', 'when', 'what', 'why', 'action'],
  base: {
    root: { listStyle: 'none' },
    item: {
      display: { base: 'block', md: 'grid' },
      gridTemplateColumns: '120px minmax(0, 1fr) 216px',
      gap: '0 24px',
      padding: '14px 0 15px',
      borderTop: '1px solid',
      borderColor: 'rule',
      _first: { borderColor: 'ink' },
    },
    when: {
      fontSize: '13px',
      lineHeight: '24px',
      color: 'ink2',
      fontFeatureSettings: '"tnum"',
      '& b': { color: 'warn', fontWeight: 600 },
    },
    what: {
      textStyle: 'agenda',
      '& a': { textDecorationColor: 'transparent', _hover: { textDecorationColor: 'accent' } },
    },
    why: { fontSize: '14px', lineHeight: '21px', color: 'ink2', marginTop: '2px' },
    action: { textAlign: { base: 'left', md: 'right' }, marginTop: { base: '8px', md: 0 }, textStyle: 'small' },
  },
});

/** A rehearsal: first, then, …, last. */
export const dryRunRecipe = defineSlotRecipe({
  slots: ['root', 'step', 'when', 'what', 'detail'],
  base: {
    root: { listStyle: 'none' },
    step: {
      display: 'grid',
      gridTemplateColumns: { base: '52px minmax(0, 1fr)', md: '72px minmax(0, 1fr)' },
      gap: '0 24px',
      padding: '9px 0 10px',
      borderTop: '1px solid',
      borderColor: 'rule',
      _first: { borderColor: 'ink' },
    },
    when: { fontSize: '13px', lineHeight: '24px', color: 'ink2' },
    what: { fontWeight: 500, fontSize: '16px', lineHeight: '24px' },
    detail: { fontSize: '14px', lineHeight: '21px', color: 'ink2', overflowWrap: 'anywhere' },
  },
});

/** A remark anchored to a phrase, and the same number in the list. */
export const remarkRecipe = defineSlotRecipe({
  slots: ['anchor', 'number', 'root', 'by'],
  base: {
    anchor: {
      background: 'linear-gradient(var(--dfl-colors-accent), var(--dfl-colors-accent)) 0 100% / 100% 1.5px no-repeat',
      '&[data-current]': { backgroundColor: 'accentTint' },
    },
    number: {
      display: 'inline-block',
      minWidth: '18px',
      height: '18px',
      border: '1.3px solid',
      borderColor: 'accent',
      color: 'accent',
      borderRadius: 'control',
      fontSize: '11.5px',
      fontWeight: 600,
      lineHeight: '16px',
      textAlign: 'center',
      fontFeatureSettings: '"tnum"',
      '&[data-settled]': { borderColor: 'control', color: 'ink2' },
    },
    root: {
      display: 'grid',
      gridTemplateColumns: '28px minmax(0, 1fr)',
      padding: '10px 0 12px',
      borderTop: '1px solid',
      borderColor: 'rule',
      textStyle: 'small',
      '&[data-current]': { borderTop: '1.5px solid', borderColor: 'accent' },
    },
    by: { color: 'ink2', fontSize: '13px' },
  },
});

/** Sentences with a mark before them: verdicts of tests, cautions, warnings. */
export const statementsRecipe = defineSlotRecipe({
  slots: ['root', 'item'],
  base: {
    root: { listStyle: 'none' },
    item: {
      display: 'grid',
      gridTemplateColumns: '24px minmax(0, 1fr)',
      padding: '9px 0',
      borderTop: '1px solid',
      borderColor: 'rule',
      maxWidth: '760px',
      _first: { borderColor: 'ink' },
      '& b': { fontWeight: 600, color: 'ink' },
      color: 'ink2',
    },
  },
  variants: {
    kind: {
      verdicts: {},
      cautions: {
        item: {
          display: 'block',
          border: 'none',
          padding: '0 0 0 24px',
          marginTop: '6px',
          position: 'relative',
          maxWidth: '640px',
          color: 'ink',
          _before: {
            content: '""',
            position: 'absolute',
            left: 0,
            top: '12px',
            width: '12px',
            borderTop: '1.5px solid',
            borderColor: 'warn',
          },
        },
      },
    },
  },
  defaultVariants: { kind: 'verdicts' },
});
