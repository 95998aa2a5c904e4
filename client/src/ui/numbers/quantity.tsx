import {
  differenceFromSi,
  fromSi,
  unitLabel,
  useReaderUnits,
  type Quantity as QuantityKind,
  type ReaderUnits,
} from '../../lib/units';
import { formatShort, withUnit } from '../../lib/format-quantity';
import { Concise, Num, Unit } from './num';

interface QuantityProps {
  readonly kind: QuantityKind;
  /** SI */
  readonly value: number;
  /** SI, standard uncertainty; without it the value is printed to the digits that give it back. */
  readonly uncertainty?: number | null;
}

/** A temperature, pressure or diffusivity in the reader's unit, with its uncertainty and always with its unit. */
export function Quantity({ kind, value, uncertainty }: QuantityProps) {
  const unit = useReaderUnits()[kind];
  const label = unitLabel(kind, unit);
  if (uncertainty) {
    return (
      <Concise value={fromSi(kind, value, unit)} uncertainty={differenceFromSi(kind, uncertainty, unit)} unit={label} />
    );
  }
  return (
    <Num>
      {formatShort(fromSi(kind, value, unit))}
      {'\u00a0'}
      <Unit>{label}</Unit>
    </Num>
  );
}

/** `283.15 K to 448.15 K` in the reader's unit. */
export function QuantityRange({
  kind,
  low,
  high,
  digits = 6,
}: {
  readonly kind: QuantityKind;
  readonly low: number;
  readonly high: number;
  readonly digits?: number;
}) {
  const unit = useReaderUnits()[kind];
  return <span>{rangeText(kind, low, high, unit, digits)}</span>;
}

export function rangeText<K extends QuantityKind>(
  kind: K,
  low: number,
  high: number,
  unit: ReaderUnits[K],
  digits = 6,
): string {
  const label = unitLabel(kind, unit);
  const end = (value: number) => withUnit(formatShort(fromSi(kind, value, unit), digits), label);
  return `${end(low)} to ${end(high)}`;
}

/** `298.15 K` as plain text, in that unit. */
export const quantityText = <K extends QuantityKind>(
  kind: K,
  value: number,
  unit: ReaderUnits[K],
  digits = 6,
): string => withUnit(formatShort(fromSi(kind, value, unit), digits), unitLabel(kind, unit));
