import { chakra } from '@chakra-ui/react';
import { type ReactNode } from 'react';
import { type TextRun } from '../../lib/typeset';
import { Runs } from './typeset';

/** One piece of an equation, read from left to right: runs, or a fraction; perhaps in brackets, perhaps with an exponent. */
export interface EquationPiece {
  readonly runs: readonly TextRun[];
  readonly numerator?: readonly TextRun[] | null;
  readonly denominator?: readonly TextRun[] | null;
  readonly bracketed: boolean;
  readonly exponent?: readonly TextRun[] | null;
}

interface EquationProps {
  readonly pieces: readonly EquationPiece[];
  /** In words, for those who hear it. */
  readonly spoken: string;
}

/** A correlation as a set equation. */
export const Equation = ({ pieces, spoken }: EquationProps) => (
  <chakra.span
    role="math"
    aria-label={spoken}
    display="inline-flex"
    alignItems="center"
    gap="0.02em"
    whiteSpace="nowrap"
    textStyle={{ base: 'equationSmall', md: 'equation' }}
    css={{ '& sub': { fontSize: '0.6em', top: '0.5em' } }}
  >
    {pieces.map((piece, i) => (
      <Piece key={i} piece={piece} />
    ))}
  </chakra.span>
);

function Piece({ piece }: { readonly piece: EquationPiece }) {
  const inner =
    piece.numerator && piece.denominator ? (
      <Fraction above={<Runs runs={piece.numerator} />} below={<Runs runs={piece.denominator} />} />
    ) : (
      <chakra.span whiteSpace="pre">
        <Runs runs={piece.runs} />
      </chakra.span>
    );
  return (
    <>
      {piece.bracketed ? <Bracketed>{inner}</Bracketed> : inner}
      {piece.exponent && (
        <chakra.sup alignSelf="flex-start" top="0.05em" lineHeight="1" fontSize="0.66em" margin="0 0.2em 0 0.1em">
          <Runs runs={piece.exponent} />
        </chakra.sup>
      )}
    </>
  );
}

const Fraction = ({ above, below }: { readonly above: ReactNode; readonly below: ReactNode }) => (
  <chakra.span
    display="inline-flex"
    flexDirection="column"
    textAlign="center"
    lineHeight="1.18"
    margin="0 0.04em"
    css={{ '&& sub': { top: '0.24em' } }}
  >
    <chakra.span borderBottom="1px solid currentColor" padding="0 0.14em 0.06em">
      {above}
    </chakra.span>
    <chakra.span padding="0.06em 0.14em 0">{below}</chakra.span>
  </chakra.span>
);

const Bracketed = ({ children }: { readonly children: ReactNode }) => (
  <>
    <Bracket>(</Bracket>
    {children}
    <Bracket>)</Bracket>
  </>
);

const Bracket = ({ children }: { readonly children: string }) => (
  <chakra.span
    fontWeight={250}
    transform="scale(0.9, 2.15)"
    lineHeight="1"
    margin="0 0.01em"
    position="relative"
    top="-0.03em"
  >
    {children}
  </chakra.span>
);
