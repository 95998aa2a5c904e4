import { chakra } from '@chakra-ui/react';
import { type ReactNode } from 'react';

/** States of a series or a version, in the words of the page. */
export type State =
  | 'draft'
  | 'submitted'
  | 'in review'
  | 'returned'
  | 'approved'
  | 'accepted'
  | 'released'
  | 'superseded'
  | 'withdrawn'
  | 'retired';

/** How full the tube stands, 0 to 1. */
const LEVEL: Readonly<Record<State, number>> = {
  draft: 0,
  submitted: 0,
  'in review': 0.34,
  returned: 0,
  approved: 0.67,
  accepted: 1,
  released: 1,
  superseded: 0,
  withdrawn: 0,
  retired: 0,
};
const BOTTOM = 12.6;
const TURN: Partial<Record<State, number>> = { withdrawn: 180, retired: 180, returned: 52 };

/** The state of an API enum value: `IN_REVIEW` is `in review`. */
export const stateOf = (status: Uppercase<string>): State => status.toLowerCase().replace('_', ' ') as State;

interface StateMarkProps {
  readonly state: State;
  /** What stands beside the mark; the word of the state when absent. */
  readonly children?: ReactNode;
}

/** An evaporation tube that fills as the thing matures, and the word beside it: never colour or mark alone. */
export function StateMark({ state, children }: StateMarkProps) {
  const level = BOTTOM - (BOTTOM - 2.8) * LEVEL[state];
  const colour = state === 'withdrawn' ? 'warn' : 'ink';
  return (
    <chakra.span
      display="inline-flex"
      gap="7px"
      alignItems="baseline"
      fontWeight={600}
      color={colour}
      whiteSpace="nowrap"
    >
      <chakra.svg
        width="13px"
        height="16px"
        viewBox="0 0 13 16"
        aria-hidden
        flex="none"
        alignSelf="center"
        marginTop="-1px"
      >
        <g transform={TURN[state] === undefined ? undefined : `rotate(${TURN[state]} 6.5 7.5)`}>
          {LEVEL[state] > 0 && (
            <chakra.path fill="accent" d={`M3 ${level}H10V10.9A2.9 2.9 0 0 1 7.1 13.8H5.9A2.9 2.9 0 0 1 3 10.9Z`} />
          )}
          <chakra.path
            fill="none"
            stroke="currentColor"
            strokeWidth="1.3"
            d="M1.2 1.3H3V10.9A2.9 2.9 0 0 0 5.9 13.8H7.1A2.9 2.9 0 0 0 10 10.9V1.3H11.8"
          />
          <Inside state={state} level={level} />
        </g>
      </chakra.svg>
      <span>{children ?? state}</span>
    </chakra.span>
  );
}

/** A drop at the mouth, a line of sight at the level, or the old levels. */
function Inside({ state, level }: { readonly state: State; readonly level: number }) {
  if (state === 'submitted') return <chakra.circle fill="accent" cx="6.5" cy="5" r="2.3" />;
  if (state === 'in review') return <path fill="none" stroke="currentColor" strokeWidth="1.2" d={`M0 ${level}H13`} />;
  if (state === 'superseded') {
    return <chakra.path fill="none" stroke="ink2" strokeWidth="1.3" d="M4.4 4.2H8.6M4.4 6.7H8.6M4.4 9.2H8.6" />;
  }
  return null;
}
