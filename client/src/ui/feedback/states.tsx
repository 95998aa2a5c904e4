import { chakra } from '@chakra-ui/react';
import { useEffect, useState, type ReactNode } from 'react';
import { WordButton } from '../form/button';
import { WarnMark } from '../marks/marks';

/** Nothing here yet: one sentence and the ways forward. */
export const Empty = ({ sentence, children }: { readonly sentence: ReactNode; readonly children?: ReactNode }) => (
  <chakra.div marginTop="12px">
    <chakra.p textStyle="small" color="ink2">
      {sentence}
    </chakra.p>
    {children !== undefined && <chakra.p textStyle="small">{children}</chakra.p>}
  </chakra.div>
);

const QUIET_FOR_MS = 300;

/** Hairlines where text will be, after a moment; the words for those who cannot see them. */
export function Loading({ what, children }: { readonly what: string; readonly children?: ReactNode }) {
  const [shown, setShown] = useState(false);
  useEffect(() => {
    const timer = setTimeout(() => setShown(true), QUIET_FOR_MS);
    return () => clearTimeout(timer);
  }, []);
  return (
    <chakra.div role="status" aria-busy marginTop="12px" minHeight="72px">
      <chakra.span position="absolute" width="1px" height="1px" overflow="hidden" clipPath="inset(50%)">
        {`Loading ${what}`}
      </chakra.span>
      {shown &&
        ['92%', '78%', '86%'].map((width) => (
          <chakra.div
            key={width}
            height="1px"
            background="control"
            marginBlock="11px"
            maxWidth="640px"
            width={width}
            aria-hidden
          />
        ))}
      {shown && children}
    </chakra.div>
  );
}

interface FailedProps {
  /** In the trade's words: “No fit.” */
  readonly what: string;
  /** Why, and what is kept. */
  readonly why: ReactNode;
  readonly onRetry?: (() => void) | undefined;
  readonly children?: ReactNode;
}

/** What failed, what is kept, what to do. */
export const Failed = ({ what, why, onRetry, children }: FailedProps) => (
  <chakra.div role="alert" marginTop="12px" textStyle="small" maxWidth="640px">
    <p>
      <chakra.span color="warn">
        <WarnMark />
        <b style={{ fontWeight: 600 }}>{what}</b>
      </chakra.span>{' '}
      {why}
    </p>
    <p>
      {onRetry !== undefined && <WordButton onClick={onRetry}>Try again</WordButton>}
      {children}
    </p>
  </chakra.div>
);

interface ProgressProps {
  readonly label: string;
  /** 0 to 1; null while the size of the work is unknown. */
  readonly share: number | null;
  readonly children?: ReactNode;
}

/** How far a long action has come. */
export const Progress = ({ label, share, children }: ProgressProps) => (
  <div>
    <chakra.div
      role="progressbar"
      aria-label={label}
      aria-valuemin={0}
      aria-valuemax={100}
      {...(share === null ? {} : { 'aria-valuenow': Math.round(share * 100) })}
      height="5px"
      border="1px solid"
      borderColor="control"
      margin="6px 0 4px"
    >
      <chakra.div height="100%" background="accent" style={{ width: `${100 * (share ?? 0)}%` }} />
    </chakra.div>
    {children}
  </div>
);
