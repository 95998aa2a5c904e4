import { chakra } from '@chakra-ui/react';

/** A point between two limits, or outside them. The words stand beside it. */
export function RangeMark({ within }: { readonly within: boolean }) {
  const right = within ? 23 : 17;
  return (
    <chakra.svg
      width="26px"
      height="12px"
      viewBox="0 0 26 12"
      aria-hidden
      display="inline"
      verticalAlign="-1px"
      marginRight="6px"
    >
      <chakra.path
        fill="none"
        stroke={within ? 'ink' : 'ink3'}
        strokeWidth="1.2"
        d={`M3 1.5V10.5M${right} 1.5V10.5M3 6H${right}`}
      />
      <chakra.circle fill={within ? 'accent' : 'warn'} cx={within ? 13 : 23} cy="6" r="2.8" />
    </chakra.svg>
  );
}

const mark = {
  width: '13px',
  height: '13px',
  viewBox: '0 0 13 13',
  'aria-hidden': true,
  display: 'inline',
  marginRight: '7px',
} as const;

/** A warning: always with its word. */
export const WarnMark = () => (
  <chakra.svg {...mark} verticalAlign="-1px" fill="warn">
    <path d="M6.5 1L12.3 12H.7Z" />
    <chakra.path d="M6.5 4.8V8.2M6.5 9.4V10.7" stroke="paper" strokeWidth="1.4" fill="none" />
  </chakra.svg>
);

export const NoteMark = () => (
  <chakra.svg {...mark} verticalAlign="-2px" fill="none" stroke="ink2" strokeWidth="1.2">
    <circle cx="6.5" cy="6.5" r="5.4" />
    <path d="M6.5 5.8V9.6M6.5 3.3V4.7" />
  </chakra.svg>
);

/** Met, done, agreed. */
export const TickMark = () => (
  <chakra.svg {...mark} verticalAlign="-1px" fill="none" stroke="ink" strokeWidth="1.7">
    <path d="M1.5 7L5 10.5L11.5 2.5" />
  </chakra.svg>
);

/** One link of the chain of releases. */
export const ChainLink = () => (
  <chakra.svg width="13px" height="28px" viewBox="0 0 13 28" aria-hidden display="inline-block" verticalAlign="middle">
    <chakra.path stroke="control" strokeWidth="1.2" d="M6.5 0V9M6.5 19V28" />
    <chakra.rect fill="none" stroke="ink" strokeWidth="1.3" x="3" y="9" width="7" height="10" rx="3.5" />
  </chakra.svg>
);
