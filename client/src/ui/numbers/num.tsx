import { chakra } from '@chakra-ui/react';
import { type ReactNode } from 'react';
import { conciseWithPower } from '../../lib/format-quantity';

/** Figures that stand in columns: tabular. */
export const Num = ({ children }: { readonly children: ReactNode }) => (
  <chakra.span fontFeatureSettings='"tnum", "kern"' whiteSpace="nowrap">
    {children}
  </chakra.span>
);

/** A unit as printed: digits after a letter are exponents, `cm²/s`. */
export const Unit = ({ children }: { readonly children: string }) => <span>{superscripted(children)}</span>;

const EXPONENTS: Readonly<Record<string, string>> = {
  '²': '2',
  '³': '3',
  '⁻': '−',
  '¹': '1',
  '⁴': '4',
  '⁵': '5',
  '⁶': '6',
};

/** Raised digits by markup: the typeface has only some of them as characters. */
function superscripted(unit: string): ReactNode[] {
  return unit
    .split(/([²³⁻¹⁴⁵⁶]+)/)
    .map((part, i) =>
      i % 2 === 1 ? <sup key={i}>{[...part].map((digit) => EXPONENTS[digit] ?? digit).join('')}</sup> : part,
    );
}

interface ConciseProps {
  readonly value: number;
  /** Standard uncertainty in the same unit. */
  readonly uncertainty: number;
  readonly unit?: string;
}

/** `0.12455(50) cm²/s`: u in the last digits; powers of ten where plain digits would be unreadable. */
export function Concise({ value, uncertainty, unit }: ConciseProps) {
  const { mantissa, exponent } = conciseWithPower(value, uncertainty);
  return (
    <Num>
      {mantissa}
      {exponent !== 0 && (
        <>
          {' × 10'}
          <sup>{String(exponent).replace('-', '−')}</sup>
        </>
      )}
      {unit !== undefined && unit !== '1' && (
        <>
          {'\u00a0'}
          <Unit>{unit}</Unit>
        </>
      )}
    </Num>
  );
}
