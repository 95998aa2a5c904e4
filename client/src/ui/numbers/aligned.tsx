import { chakra } from '@chakra-ui/react';

interface AlignedProps {
  /** A number as printed. */
  readonly children: string;
  /** The most places after the decimal point that the column has. */
  readonly places: number;
}

/** A cell whose decimal point stands under those of its column: missing places are padded with hidden digits. */
export function Aligned({ children, places }: AlignedProps) {
  const have = children.includes('.') ? children.length - children.lastIndexOf('.') - 1 : 0;
  const missing = Math.max(0, places - have);
  if (missing === 0) return <>{children}</>;
  const padding = (have === 0 ? '.' : '') + '0'.repeat(missing);
  return (
    <>
      {children}
      <chakra.span visibility="hidden" aria-hidden userSelect="none">
        {padding}
      </chakra.span>
    </>
  );
}

/** The most places after the decimal point among printed numbers. */
export const mostPlaces = (texts: readonly string[]): number =>
  Math.max(0, ...texts.map((text) => (text.includes('.') ? text.length - text.lastIndexOf('.') - 1 : 0)));
